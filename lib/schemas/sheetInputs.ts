import { z } from "zod";
import { listQuerySchema } from "./listQuery";
import type { ListQuery, SheetState } from "./views";

export const sheetSorts = ["number", "state", "partNumber", "partName", "machine", "bends", "releasedAt", "createdAt"] as const;

export const sheetListQuerySchema = listQuerySchema(sheetSorts, "createdAt", "desc").extend({
  state: z.enum(["draft", "released", "superseded"], { error: "must be draft, released or superseded" }).optional(),
  machineId: z.uuid("must be the id of a machine").optional(),
});

export interface SheetListQuery extends ListQuery {
  readonly sort?: (typeof sheetSorts)[number] | undefined;
  readonly state?: SheetState | undefined;
  readonly machineId?: string | undefined;
}
