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

/** Seconds that a search may take. */
export const planTimeLimit = { least: 1, most: 600, usual: 60 } as const;
/** Other plans beside the best. */
export const planAlternatives = { most: 8, usual: 3 } as const;

const batch = z.number({ error: "must be the number of parts to be made" }).int("must be a whole number of parts").min(1, "must be 1 or more").max(1_000_000, "must be at most 1000000");
const limitSeconds = z.number({ error: "must be a number of seconds" }).min(planTimeLimit.least, `must be ${planTimeLimit.least} or more`).max(planTimeLimit.most, `must be at most ${planTimeLimit.most}`);

export const startPlanSchema = z.strictObject({
  partId: z.uuid("must be the id of a part"),
  /** The newest when absent. */
  revision: z.number().int("must be a whole number").min(1, "must be 1 or more").max(2_147_483_647).optional(),
  machineId: z.uuid("must be the id of a machine"),
  batch,
  limitSeconds: limitSeconds.optional(),
  alternatives: z.number({ error: "must be a number of plans" }).int("must be a whole number").min(0, "must be 0 or more").max(planAlternatives.most, `must be at most ${planAlternatives.most}`).optional(),
  /** Whether pieces that stand at another brake may be fetched from there; if not they count as promised. */
  otherBrakes: z.boolean().optional(),
});
export type StartPlanInput = z.input<typeof startPlanSchema>;

const id = z.string().min(1, "must name something of the part").max(200);
const bendWish = z.strictObject({ bend: id, front: id.exactOptional(), punch: id.exactOptional(), die: id.exactOptional() });

/** A person's own order: bend ids, those of one stroke joined with "+"; and what is asked of single bends. */
export const ownOrderSchema = z.strictObject({
  order: z.array(id).min(1, "must name every bend").max(30),
  wishes: z.array(bendWish).max(30).optional(),
  limitSeconds: limitSeconds.optional(),
});
export type OwnOrderInput = z.input<typeof ownOrderSchema>;

/** Without an order: what the plan itself is about. */
export const findChangesSchema = ownOrderSchema.omit({ limitSeconds: true }).partial();
export type FindChangesInput = z.input<typeof findChangesSchema>;

export const chooseAlternativeSchema = z.strictObject({ index: z.number().int("must be a whole number").min(0, "must be 0 or more").max(100) });

export const searchOnSchema = z.strictObject({ moreSeconds: limitSeconds });

export const planJobListQuerySchema = z.strictObject({
  partId: z.uuid("must be the id of a part").optional(),
  planId: z.uuid("must be the id of a plan").optional(),
});
export interface PlanJobListQuery {
  readonly partId?: string | undefined;
  readonly planId?: string | undefined;
}
