import { completeMaterial } from "@/bending/handbook/completeMaterial";
import type { Connection } from "../connection";
import type { MaterialRow } from "./materialRow";

/** Materials with their newest version, by short name; those given, or all. */
export async function findMaterials(db: Connection, only: { readonly ids?: readonly string[] } = {}): Promise<readonly MaterialRow[]> {
  const query = db("materials as material")
    .join("material_versions as made", (join) => { join.on("made.material_id", "material.id").andOn("made.version", "material.version"); })
    .leftJoin("users as author", "author.id", "made.created_by")
    .leftJoin("users as remover", "remover.id", "material.withdrawn_by")
    .orderBy("material.id");
  if (only.ids) void query.whereIn("material.id", [...only.ids]);
  const rows: MaterialRow[] = await query.select([
    "material.id", "material.facts", "material.version", "made.id as version_id", "material.withdrawn_at", "remover.name as withdrawn_by",
    "made.created_at as changed_at", "author.name as changed_by",
  ]);
  return rows.map((row) => ({ ...row, facts: completeMaterial(row.facts) }));
}
