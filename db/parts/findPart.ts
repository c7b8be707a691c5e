import type { PartDocument } from "@/bending/part/partDocument";
import type { Connection } from "../connection";

export interface PartRow {
  readonly id: string;
  readonly number: string;
  readonly latest_revision: number;
}

export interface RevisionRow {
  readonly id: string;
  readonly revision: number;
  readonly name: string;
  readonly note: string;
  readonly created_at: Date;
  readonly created_by: string | null;
}

export interface FoundPart {
  readonly part: PartRow;
  /** Newest first. */
  readonly revisions: readonly RevisionRow[];
  readonly revision: RevisionRow & { readonly document: PartDocument };
}

/** A part with the revision asked for, or its newest; undefined when there is no such part or revision. */
export async function findPart(db: Connection, id: string, revision?: number): Promise<FoundPart | undefined> {
  const part = await db<PartRow>("parts").where({ id }).first("id", "number", "latest_revision");
  if (!part) return undefined;
  const revisions = await db("part_revisions as revision")
    .leftJoin("users as author", "author.id", "revision.created_by")
    .where("revision.part_id", id)
    .select<RevisionRow[]>("revision.id", "revision.revision", "revision.name", "revision.note", "revision.created_at", "author.name as created_by")
    .orderBy("revision.revision", "desc");
  const chosen = revisions.find((row) => row.revision === (revision ?? part.latest_revision));
  if (!chosen) return undefined;
  const stored = await db<{ id: string; document: PartDocument }>("part_revisions").where({ id: chosen.id }).first("document");
  return stored ? { part, revisions, revision: { ...chosen, document: stored.document } } : undefined;
}
