import type { z } from "zod";
import { noSuchPlan } from "./noSuchPlan";
import { planOf } from "./planOf";
import { questionOf } from "./questionOf";
import type { Result } from "@/bending/core/result";
import { database } from "@/db/client";
import { findPlan } from "@/db/plans/findPlan";
import type { Failure } from "@/lib/api/failure";
import type { SignedInPerson } from "@/lib/auth/signedInPerson";
import type { ownOrderSchema } from "@/lib/schemas/planInputs";
import type { PlanJobView } from "@/lib/schemas/views";

/** Plans a person's own order for the part, machine and batch of a plan; what comes of it is a plan of its own. */
export async function planOwnOrder(person: SignedInPerson, planId: string, { order, wishes, limitSeconds }: z.output<typeof ownOrderSchema>): Promise<Result<PlanJobView, Failure>> {
  const row = await findPlan(database(), planId);
  if (!row) return noSuchPlan();
  return planOf(person, { ...questionOf(row), order, wishes: wishes ?? [], alternatives: 0, ...(limitSeconds === undefined ? {} : { limitSeconds }) }, planId);
}
