import type { Connection } from "../connection";

/** The next number of the shop's own row that no part bears yet. */
export async function nextPartNumber(db: Connection): Promise<string> {
  for (;;) {
    const { rows } = await db.raw<{ rows: { number: string; taken: boolean }[] }>(
      `select next.number, exists (select 1 from parts where parts.number = next.number) as taken
       from (select 'P-' || nextval('part_number') as number) as next`);
    const [row] = rows;
    if (row && !row.taken) return row.number;
  }
}
