import { currentPieces } from "../sheets/currentPieces";
import { getShopSettings } from "../settings/getShopSettings";
import { recordEvent } from "../recordEvent";
import { lastCheck } from "./lastCheck";
import { machineOf } from "./machineOf";
import { noSuchPlan } from "./noSuchPlan";
import { startJob } from "./startJob";
import { invariant } from "@/bending/core/invariant";
import { fail, type Result } from "@/bending/core/result";
import { PLAN_ENGINE } from "@/bending/plan/emptyPlan";
import type { StoredCheck } from "@/bending/plan/storedPlan";
import { database } from "@/db/client";
import { findMachine } from "@/db/machines/findMachine";
import { findPlan, type PlanRow } from "@/db/plans/findPlan";
import { insertPlanCheck } from "@/db/plans/insertPlanCheck";
import { findToolsInService } from "@/db/tools/findToolsInService";
import type { Failure } from "@/lib/api/failure";
import type { SignedInPerson } from "@/lib/auth/signedInPerson";
import type { PlanJobView } from "@/lib/schemas/views";

const CHECK_LIMIT_MS = 60_000;

/** Goes through a stored plan with the machine, tools and pieces of today, in the background; what came of it is kept with the plan. */
export async function checkPlan(person: SignedInPerson, planId: string): Promise<Result<PlanJobView, Failure>> {
  const db = database();
  const row = await findPlan(db, planId);
  if (!row) return noSuchPlan();
  if (row.plan.steps.length === 0) return fail({ kind: "conflict", message: "This plan has no steps to look over. Plan the part again instead." });
  const machine = await findMachine(db, row.machine_id);
  if (!machine) return fail({ kind: "conflict", message: `The brake ${row.machine_name} is not in the list any more.` });
  const [{ forceFactors }, tools, { missing }] = await Promise.all([getShopSettings(), findToolsInService(db), currentPieces(db, row.plan, row.tools)]);
  const subject = `${row.part_number} rev ${row.revision} on ${row.machine_name}`;
  return startJob({
    key: `check ${planId}`,
    place: { partId: row.part_id, fromPlanId: planId, subject, by: person.name },
    task: {
      kind: "check", limitMs: CHECK_LIMIT_MS,
      stored: { plan: row.plan, document: row.part_document, material: row.material, machine: machineOf(row.machine_document), tools: row.tools },
      now: { engine: PLAN_ENGINE, machine: machineOf(machine.document), tools, missing, airForceFactor: forceFactors.air },
    },
    store: async (answer) => {
      invariant(answer.kind === "check", "a checking task answers a check");
      await keep(person, row, subject, answer.check);
      const check = await lastCheck(database(), planId);
      return { planId, message: answer.check.holds ? "Done: the plan holds" : "Done: the plan does not hold any more", result: check ? { kind: "check", check } : null };
    },
  });
}

async function keep(person: SignedInPerson, row: PlanRow, subject: string, check: StoredCheck): Promise<void> {
  await database().transaction(async (within) => {
    await insertPlanCheck(within, row.id, check, person.id);
    await recordEvent(within, person, "looked a plan over again", subject, check.holds ? "holds" : `does not hold: ${check.wrong[0]?.reason.message ?? ""}`);
  });
}
