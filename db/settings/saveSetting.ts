import type { Connection } from "../connection";

/** Writes a setting when its version is still `basedOn` (0: nobody has set it yet). False: somebody was quicker. */
export async function saveSetting(db: Connection, subject: string, basedOn: number, value: unknown, by: string): Promise<boolean> {
  const row = { value: JSON.stringify(value), version: basedOn + 1, updated_at: db.fn.now(), updated_by: by };
  if (basedOn > 0) return (await db("shop_settings").where({ subject, version: basedOn }).update(row)) === 1;
  const put = await db("shop_settings").insert({ subject, ...row }).onConflict("subject").ignore().returning<{ subject: string }[]>("subject");
  return put.length === 1;
}
