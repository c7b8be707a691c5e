import type { Connection } from "../connection";

/** The plan of the same revision and inputs, if it came to an answer. */
export async function findSamePlan(db: Connection, revisionId: string, inputsDigest: string): Promise<string | undefined> {
  const row = await db<{ id: string; revision_id: string; inputs_digest: string; status: string }>("plans")
    .where({ revision_id: revisionId, inputs_digest: inputsDigest })
    .whereNot({ status: "unknown" })
    .first("id");
  return row?.id;
}
