import { completeMaterial } from "@/bending/handbook/completeMaterial";
import type { Connection } from "../connection";
import type { MaterialVersionRow } from "./materialRow";

/** Versions of one material, newest first, or those of the given ids. */
export async function findMaterialVersions(db: Connection, which: { readonly materialId: string } | { readonly ids: readonly string[] }): Promise<readonly MaterialVersionRow[]> {
  const query = db("material_versions as made").leftJoin("users as author", "author.id", "made.created_by").orderBy("made.version", "desc");
  if ("ids" in which) void query.whereIn("made.id", [...which.ids]);
  else void query.where("made.material_id", which.materialId);
  const rows: MaterialVersionRow[] = await query.select(["made.id", "made.material_id", "made.version", "made.facts", "made.note", "made.created_at", "author.name as created_by"]);
  return rows.map((row) => ({ ...row, facts: completeMaterial(row.facts) }));
}
