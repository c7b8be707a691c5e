import { z } from "zod";
import { DRAWING_FORMATS } from "@/bending/exchange/drawPart";
import { listQuerySchema } from "./listQuery";
import { filledText, plainText } from "./plainText";
import type { ListQuery } from "./views";

export const partSorts = ["number", "name", "material", "thickness", "bends", "revision", "updatedAt"] as const;

export const partListQuerySchema = listQuerySchema(partSorts, "updatedAt", "desc").extend({ material: plainText(60).optional() });

export interface PartListQuery extends ListQuery {
  readonly sort?: (typeof partSorts)[number] | undefined;
  readonly material?: string | undefined;
}

const note = plainText(2000).default("");

/** Checked by the library, with its own words; also when it is missing. */
const document = z.unknown().optional();

export const createPartSchema = z.strictObject({ number: filledText(60).optional(), document, note });

export interface CreatePartInput {
  /** Made up when absent. */
  readonly number?: string | undefined;
  /** A part document (part/1), as typed or read from a file. */
  readonly document: unknown;
  readonly note?: string | undefined;
}

export const addRevisionSchema = z.strictObject({
  basedOn: z.number({ error: "must be the number of the revision that was changed" }).int("must be a whole number").min(1, "must be 1 or more").max(2_147_483_646, "is higher than any revision"),
  document,
  note,
});

export interface AddRevisionInput {
  /** The revision that was changed: when a newer one exists, nothing is saved. */
  readonly basedOn: number;
  readonly document: unknown;
  readonly note?: string | undefined;
}

export const revisionQuerySchema = z.object({
  revision: z.coerce.number({ error: "must be a whole number from 1" }).int("must be a whole number from 1").min(1, "must be 1 or more").max(2_147_483_647).optional(),
});

const yesOrNo = z.enum(["yes", "no"], "must be yes or no").default("no");

export const drawingQuerySchema = revisionQuerySchema.extend({
  format: z.enum(DRAWING_FORMATS, "must be dxf, svg or glb"),
  /** Marks to be etched, in DXF only: ticks on the bend lines, the part's number. */
  ticks: yesOrNo,
  number: yesOrNo,
});

export type DrawingQuery = z.output<typeof drawingQuerySchema>;
