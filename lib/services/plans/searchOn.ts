import type { z } from "zod";
import { noSuchPlan } from "./noSuchPlan";
import { planOf } from "./planOf";
import { questionOf } from "./questionOf";
import { fail, type Result } from "@/bending/core/result";
import { database } from "@/db/client";
import { findPlan } from "@/db/plans/findPlan";
import type { Failure } from "@/lib/api/failure";
import type { SignedInPerson } from "@/lib/auth/signedInPerson";
import { planTimeLimit, type searchOnSchema } from "@/lib/schemas/planInputs";
import type { PlanJobView } from "@/lib/schemas/views";

/** Asks the question of a plan again with more time than it had. A plan that nothing can better is not searched on. */
export async function searchOn(person: SignedInPerson, planId: string, { moreSeconds }: z.output<typeof searchOnSchema>): Promise<Result<PlanJobView, Failure>> {
  const row = await findPlan(database(), planId);
  if (!row) return noSuchPlan();
  if (row.ended === "itself") return fail({ kind: "conflict", message: "This search ended by itself: more time would change nothing." });
  const limitSeconds = Math.min(planTimeLimit.most, row.limit_ms / 1000 + moreSeconds);
  return planOf(person, { ...questionOf(row), limitSeconds }, planId);
}
