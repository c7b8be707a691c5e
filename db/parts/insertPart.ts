import type { Connection } from "../connection";
import type { NewRevision } from "./newRevision";
import { nextPartNumber } from "./nextPartNumber";
import { revisionColumns } from "./revisionColumns";

export interface InsertedPart {
  readonly partId: string;
  readonly revisionId: string;
  readonly number: string;
}

/** Puts in a part with its first revision, both or neither. A number is made up when none is given. */
export async function insertPart(db: Connection, number: string | undefined, revision: NewRevision): Promise<InsertedPart> {
  return db.transaction(async (within) => {
    const [part] = await within("parts")
      .insert({ number: number ?? (await nextPartNumber(within)), latest_revision: 1, created_by: revision.by })
      .returning<{ id: string; number: string }[]>(["id", "number"]);
    const [row] = await within("part_revisions").insert(revisionColumns(part!.id, 1, revision)).returning<{ id: string }[]>("id");
    return { partId: part!.id, revisionId: row!.id, number: part!.number };
  });
}
