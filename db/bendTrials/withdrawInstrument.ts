import type { Connection } from "../connection";

/** Takes an instrument out of use; trials that were measured with it keep it. Answers false when there is none in use of that id. */
export async function withdrawInstrument(db: Connection, id: string, reason: string, by: string): Promise<boolean> {
  const changed = await db("measuring_instruments").where({ id }).whereNull("withdrawn_at")
    .update({ withdrawn_at: db.fn.now(), withdrawn_by: by, withdrawn_reason: reason });
  return changed === 1;
}
