import { recordEvent } from "../recordEvent";
import type { PlanInputs } from "./planInputs";
import { usedTools } from "./usedTools";
import type { PlanDocument } from "@/bending/plan/planDocument";
import type { PlanEnd } from "@/bending/plan/planEnd";
import { database } from "@/db/client";
import { insertPlan } from "@/db/plans/insertPlan";
import type { SignedInPerson } from "@/lib/auth/signedInPerson";

export interface FoundPlan {
  readonly plan: PlanDocument;
  readonly ended: PlanEnd;
  /** SHA-256 over what it follows from. */
  readonly digest: string;
  /** The plan that it was made from; null: planned afresh. */
  readonly fromPlanId: string | null;
}

/** Stores a plan with what it was made of, and answers its id. */
export async function storePlan(person: SignedInPerson, inputs: PlanInputs, { plan, ended, digest, fromPlanId }: FoundPlan): Promise<string> {
  const { partId, revisionId, machineId, machineDocument, materialVersionId, task, asked } = inputs;
  const own = task.order !== undefined;
  return database().transaction(async (within) => {
    const { id, inserted } = await insertPlan(within, {
      partId, revisionId, machineId, machineDocument, plan, material: task.material, materialVersionId, tools: usedTools(plan, task.tools), by: person.id,
      inputsDigest: digest, origin: own ? "own order" : "planned", fromPlanId, ended, limitMs: task.limitMs, asked,
    });
    if (inserted) await recordEvent(within, person, own ? "planned an order of their own" : "planned a part", inputs.subject, `${plan.status}, ${plan.steps.length} steps, batch of ${plan.batch}`);
    return id;
  });
}
