import { createHash } from "node:crypto";
import type { z } from "zod";
import { foundAgain } from "../foundAgain";
import { recordEvent } from "../recordEvent";
import { noSuchPlan } from "./noSuchPlan";
import { planDetail } from "./planDetail";
import { fail, ok, type Result } from "@/bending/core/result";
import type { PlanDocument } from "@/bending/plan/planDocument";
import { database } from "@/db/client";
import { findPlan } from "@/db/plans/findPlan";
import { insertPlan } from "@/db/plans/insertPlan";
import type { Failure } from "@/lib/api/failure";
import type { SignedInPerson } from "@/lib/auth/signedInPerson";
import type { chooseAlternativeSchema } from "@/lib/schemas/planInputs";
import type { PlanDetail } from "@/lib/schemas/views";

/** Makes one of a plan's other plans a plan of its own; chosen twice it is the same one. */
export async function chooseAlternative(person: SignedInPerson, planId: string, { index }: z.output<typeof chooseAlternativeSchema>): Promise<Result<PlanDetail, Failure>> {
  const db = database();
  const row = await findPlan(db, planId);
  if (!row) return noSuchPlan();
  const other = row.plan.alternatives?.[index];
  if (other === undefined) return fail({ kind: "invalid", message: "There is no such other plan.", errors: [{ path: "index", message: `must be under ${row.plan.alternatives?.length ?? 0}` }] });
  const plan: PlanDocument = { ...other, flat: row.plan.flat, elapsedMs: row.plan.elapsedMs };
  const id = await db.transaction(async (within) => {
    const stored = await insertPlan(within, {
      partId: row.part_id, revisionId: row.revision_id, machineId: row.machine_id, machineDocument: row.machine_document, plan, material: row.material, materialVersionId: row.material_version_id,
      tools: row.tools, by: person.id, inputsDigest: chosenDigest(row.inputs_digest, plan), origin: "chosen", fromPlanId: planId, ended: "itself", limitMs: row.limit_ms, asked: row.asked,
    });
    if (stored.inserted) await recordEvent(within, person, "chose another plan", `${row.part_number} rev ${row.revision} on ${row.machine_name}`, `${plan.order.join(", ")}; ${plan.stations.length} stations, batch of ${plan.batch}`);
    return stored.id;
  });
  return ok(foundAgain(await planDetail(db, person.role, id)));
}

/** Over the question and what was chosen for an answer: never the digest of a question alone. */
const chosenDigest = (inputs: string, { steps, stations }: PlanDocument): string =>
  createHash("sha256").update(JSON.stringify(["chosen", inputs, steps, stations])).digest("hex");
