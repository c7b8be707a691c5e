import type { z } from "zod";
import { inputsDigest } from "./inputsDigest";
import { noSuchPlan } from "./noSuchPlan";
import { planInputs } from "./planInputs";
import { questionOf } from "./questionOf";
import { startJob } from "./startJob";
import { invariant } from "@/bending/core/invariant";
import { fail, type Result } from "@/bending/core/result";
import { PLAN_ENGINE } from "@/bending/plan/emptyPlan";
import { database } from "@/db/client";
import { addToPlan } from "@/db/plans/addToPlan";
import { findPlan } from "@/db/plans/findPlan";
import type { Failure } from "@/lib/api/failure";
import type { SignedInPerson } from "@/lib/auth/signedInPerson";
import type { findChangesSchema } from "@/lib/schemas/planInputs";
import type { PlanJobView } from "@/lib/schemas/views";

const LIMIT_MS = 120_000;

/**
 * Looks for the least changes that would make a plan possible that is not, or a person's own order for what a plan is about; with the shop of
 * today. What is found for a plan whose shop has not changed is kept with it.
 */
export async function findChanges(person: SignedInPerson, planId: string, { order, wishes }: z.output<typeof findChangesSchema>): Promise<Result<PlanJobView, Failure>> {
  const db = database();
  const row = await findPlan(db, planId);
  if (!row) return noSuchPlan();
  if (order === undefined && row.plan.steps.length > 0) return fail({ kind: "conflict", message: "This plan works: there is nothing that would have to change." });
  const inputs = await planInputs(db, { ...questionOf(row), ...(order === undefined ? {} : { order, wishes: wishes ?? [] }) });
  if (!inputs.ok) return inputs;
  const { task, partId, subject } = inputs.value;
  const digest = inputsDigest(PLAN_ENGINE, task);
  const same = order === undefined && digest === row.inputs_digest;
  return startJob({
    key: `why ${planId} ${digest}`,
    place: { partId, fromPlanId: planId, subject, by: person.name },
    task: { kind: "why", limitMs: LIMIT_MS, task: { ...task, alternatives: 0 }, plan: same ? row.plan : null },
    store: async (answer) => {
      invariant(answer.kind === "why", "a task that asks why answers why");
      const { firstFailure, changes } = answer.why;
      if (same) await addToPlan(database(), planId, { changes, ...(firstFailure === null ? {} : { firstFailure }) });
      return { planId: null, message: changes.length === 0 ? "Done: no single change that was tried would do" : `Done: ${changes.length} ${changes.length === 1 ? "change" : "changes"} would make it work`, result: { kind: "why", ...answer.why, order: order ?? null } };
    },
  });
}
