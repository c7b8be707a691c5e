import type { PartDocument } from "@/bending/part/partDocument";
import type { Connection } from "../connection";

export interface NewestDocument {
  readonly part_id: string;
  readonly revision_id: string;
  readonly document: PartDocument;
}

/** The newest revision's document of each of these parts. */
export async function findNewestDocuments(db: Connection, partIds: readonly string[]): Promise<readonly NewestDocument[]> {
  return db("parts as part")
    .join("part_revisions as revision", (on) => on.on("revision.part_id", "part.id").andOn("revision.revision", "part.latest_revision"))
    .whereIn("part.id", partIds)
    .select<NewestDocument[]>("part.id as part_id", "revision.id as revision_id", "revision.document");
}
