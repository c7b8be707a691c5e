import type { PartDocument } from "@/bending/part/partDocument";
import type { Connection } from "../connection";

/** A revision's flat as it was computed when it was saved. */
export interface StoredFlatRow {
  readonly part_id: string;
  readonly saved_at: Date;
  readonly flat_width_mm: number;
  readonly flat_depth_mm: number;
  readonly document: PartDocument;
}

/** The newest revision of each of these parts, or one revision. */
export async function findStoredFlats(db: Connection, which: { readonly partIds: readonly string[] } | { readonly revisionId: string }): Promise<readonly StoredFlatRow[]> {
  const query = db("part_revisions as revision").join("parts as part", "part.id", "revision.part_id");
  if ("revisionId" in which) void query.where("revision.id", which.revisionId);
  else void query.whereIn("part.id", [...which.partIds]).whereRaw("revision.revision = part.latest_revision");
  return query.select<StoredFlatRow[]>("revision.part_id", "revision.created_at as saved_at", "revision.flat_width_mm", "revision.flat_depth_mm", "revision.document");
}
