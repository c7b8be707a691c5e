import type { Connection } from "../connection";

/** Which of these ids are there. */
export async function findKnownIds(db: Connection, table: "parts" | "sheets", ids: readonly string[]): Promise<ReadonlySet<string>> {
  if (ids.length === 0) return new Set();
  const rows = await db(table).whereIn("id", [...ids]).select<{ id: string }[]>("id");
  return new Set(rows.map(({ id }) => id));
}
