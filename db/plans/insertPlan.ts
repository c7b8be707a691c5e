import type { Connection } from "../connection";
import { findSamePlan } from "./findSamePlan";
import type { NewPlan } from "./newPlan";

/** Stores a plan and answers its id; when the same inputs were planned meanwhile, the plan that is there already. */
export async function insertPlan(db: Connection, entry: NewPlan): Promise<{ readonly id: string; readonly inserted: boolean }> {
  const { plan } = entry;
  const rows = await db("plans")
    .insert({
      part_id: entry.partId,
      revision_id: entry.revisionId,
      machine_id: entry.machineId,
      batch: plan.batch,
      status: plan.status,
      steps: plan.steps.length,
      stations: plan.stations.length,
      seconds_per_part: plan.seconds.perPart,
      setup_seconds: plan.seconds.setup,
      document: JSON.stringify(plan),
      material: JSON.stringify(entry.material),
      material_version_id: entry.materialVersionId,
      machine_document: JSON.stringify(entry.machineDocument),
      tools: JSON.stringify(entry.tools),
      inputs_digest: entry.inputsDigest,
      origin: entry.origin,
      from_plan_id: entry.fromPlanId,
      ended: entry.ended,
      limit_ms: entry.limitMs,
      asked: JSON.stringify(entry.asked),
      engine: plan.engine,
      created_by: entry.by,
    })
    .onConflict(db.raw("(revision_id, inputs_digest) where ended = 'itself'"))
    .ignore()
    .returning<{ id: string }[]>("id");
  if (rows[0]) return { id: rows[0].id, inserted: true };
  const same = await findSamePlan(db, entry.revisionId, entry.inputsDigest, entry.limitMs);
  if (same === undefined) throw new Error("a plan of the same inputs vanished while it was looked for");
  return { id: same, inserted: false };
}
