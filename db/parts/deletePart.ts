import type { Connection } from "../connection";

/** Takes away a part with its revisions, plans and drafts; the database refuses when a sheet of it was ever released. */
export async function deletePart(db: Connection, id: string): Promise<boolean> {
  return db.transaction(async (within) => {
    await within("sheets").where({ part_id: id }).delete();
    await within("plans").where({ part_id: id }).delete();
    await within("part_revisions").where({ part_id: id }).delete();
    return (await within("parts").where({ id }).delete()) === 1;
  });
}
