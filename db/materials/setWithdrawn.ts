import type { Connection } from "../connection";

/** Withdraws a material (`by` somebody) or brings it back (`null`). False: it was so already, or is not known. */
export async function setWithdrawn(db: Connection, id: string, by: string | null): Promise<boolean> {
  const query = db("materials").where({ id });
  const changed = by === null
    ? await query.whereNotNull("withdrawn_at").update({ withdrawn_at: null, withdrawn_by: null })
    : await query.whereNull("withdrawn_at").update({ withdrawn_at: db.fn.now(), withdrawn_by: by });
  return changed === 1;
}
