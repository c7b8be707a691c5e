import type { z } from "zod";
import { planOf } from "./planOf";
import type { Result } from "@/bending/core/result";
import type { Failure } from "@/lib/api/failure";
import type { SignedInPerson } from "@/lib/auth/signedInPerson";
import type { startPlanSchema } from "@/lib/schemas/planInputs";
import type { PlanJobView } from "@/lib/schemas/views";

/** Plans a part afresh, in the background. */
export async function startPlan(person: SignedInPerson, input: z.output<typeof startPlanSchema>): Promise<Result<PlanJobView, Failure>> {
  return planOf(person, input, null);
}
