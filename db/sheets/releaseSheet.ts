import type { Connection } from "../connection";

export interface SheetRelease {
  readonly id: string;
  readonly snapshot: unknown;
  readonly by: string | null;
}

/**
 * Freezes a draft and supersedes the sheet of the same part and machine that was released before, both or neither.
 * Null when the sheet is no draft (any more). Two releases at once are one after the other: the part's row is held.
 */
export async function releaseSheet(db: Connection, { id, snapshot, by }: SheetRelease): Promise<{ readonly superseded: readonly string[] } | null> {
  return db.transaction(async (within) => {
    const sheet = await within<{ id: string; part_id: string; machine_id: string }>("sheets").where({ id }).first("part_id", "machine_id");
    if (!sheet) return null;
    await within("parts").where({ id: sheet.part_id }).forUpdate().first("id");
    const draft = await within<{ id: string; state: string }>("sheets").where({ id, state: "draft" }).first("id");
    if (!draft) return null;
    const superseded = await within("sheets")
      .where({ part_id: sheet.part_id, machine_id: sheet.machine_id, state: "released" })
      .update({ state: "superseded", superseded_at: within.fn.now() })
      .returning<{ number: string }[]>("number");
    await within("sheets").where({ id }).update({
      state: "released", snapshot: JSON.stringify(snapshot), released_at: within.fn.now(), released_by: by,
    });
    return { superseded: superseded.map((row) => row.number) };
  });
}
