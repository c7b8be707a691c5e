import type { Connection } from "../connection";
import type { NewRevision } from "./newRevision";
import { revisionColumns } from "./revisionColumns";

export type RevisionInserted =
  | { readonly kind: "inserted"; readonly revisionId: string; readonly number: string; readonly revision: number }
  | { readonly kind: "no-part" }
  | { readonly kind: "stale"; readonly latest: number };

/** Adds the revision after `basedOn`; when somebody was quicker, nothing is written and the newest is named. */
export async function insertRevision(db: Connection, partId: string, basedOn: number, revision: NewRevision): Promise<RevisionInserted> {
  return db.transaction(async (within) => {
    const next = basedOn + 1;
    const [moved] = await within("parts")
      .where({ id: partId, latest_revision: basedOn })
      .update({ latest_revision: next, updated_at: within.fn.now() })
      .returning<{ number: string }[]>("number");
    if (!moved) {
      const part = await within<{ id: string; latest_revision: number }>("parts").where({ id: partId }).first("latest_revision");
      return part ? { kind: "stale", latest: part.latest_revision } : { kind: "no-part" };
    }
    const [row] = await within("part_revisions").insert(revisionColumns(partId, next, revision)).returning<{ id: string }[]>("id");
    return { kind: "inserted", revisionId: row!.id, number: moved.number, revision: next };
  });
}
