import { z } from "zod";
import { listQuerySchema } from "./listQuery";
import type { ListQuery } from "./views";

export const planSorts = ["partNumber", "partName", "machine", "status", "batch", "steps", "secondsPerPart", "createdAt"] as const;
export const planStates = ["optimal", "feasible", "infeasible", "unknown"] as const;

export const planListQuerySchema = listQuerySchema(planSorts, "createdAt", "desc").extend({
  partId: z.uuid("must be the id of a part").optional(),
  machineId: z.uuid("must be the id of a machine").optional(),
  status: z.enum(planStates, { error: `must be one of ${planStates.join(", ")}` }).optional(),
});

export interface PlanListQuery extends ListQuery {
  readonly sort?: (typeof planSorts)[number] | undefined;
  readonly partId?: string | undefined;
  readonly machineId?: string | undefined;
  readonly status?: (typeof planStates)[number] | undefined;
}

export const startPlanSchema = z.strictObject({
  partId: z.uuid("must be the id of a part"),
  /** The newest when absent. */
  revision: z.number().int("must be a whole number").min(1, "must be 1 or more").max(2_147_483_647).optional(),
  machineId: z.uuid("must be the id of a machine"),
  batch: z.number({ error: "must be the number of parts to be made" }).int("must be a whole number of parts").min(1, "must be 1 or more").max(1_000_000, "must be at most 1000000"),
});
export type StartPlanInput = z.input<typeof startPlanSchema>;
