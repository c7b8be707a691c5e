import type { Connection } from "../connection";

/**
 * The plan of the same revision and inputs that a search of so many milliseconds would come to again: one that ended by itself, else one that was given
 * at least that time and found a plan. What a person stopped is never the answer for somebody else.
 */
export async function findSamePlan(db: Connection, revisionId: string, inputsDigest: string, limitMs: number): Promise<string | undefined> {
  const row = await db("plans")
    .where({ revision_id: revisionId, inputs_digest: inputsDigest })
    .where((any) => any.where({ ended: "itself" }).orWhere((timed) => timed.where({ ended: "limit", status: "feasible" }).where("limit_ms", ">=", limitMs)))
    .orderByRaw("ended = 'itself' desc, limit_ms desc, created_at desc")
    .first<{ id: string } | undefined>("id");
  return row?.id;
}
