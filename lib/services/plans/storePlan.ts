import { recordEvent } from "../recordEvent";
import type { PlanInputs } from "./planInputs";
import { usedTools } from "./usedTools";
import type { PlanDocument } from "@/bending/plan/planDocument";
import { database } from "@/db/client";
import { insertPlan } from "@/db/plans/insertPlan";
import type { SignedInPerson } from "@/lib/auth/signedInPerson";

/** Stores a plan with what it was made of, and answers its id. */
export async function storePlan(person: SignedInPerson, inputs: PlanInputs, inputsDigest: string, plan: PlanDocument): Promise<string> {
  const { partId, revisionId, machineId, machineDocument, materialVersionId, task } = inputs;
  return database().transaction(async (within) => {
    const { id, inserted } = await insertPlan(within, {
      partId, revisionId, machineId, machineDocument, inputsDigest, plan, material: task.material, materialVersionId, tools: usedTools(plan, task.tools), by: person.id,
    });
    if (inserted) await recordEvent(within, person, "planned a part", inputs.subject, `${plan.status}, ${plan.steps.length} steps, batch of ${plan.batch}`);
    return id;
  });
}
