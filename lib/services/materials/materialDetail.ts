import { materialView } from "./materialView";
import type { Connection } from "@/db/connection";
import { countMaterialUses } from "@/db/materials/countMaterialUses";
import { findMaterial } from "@/db/materials/findMaterial";
import { findMaterialVersions } from "@/db/materials/findMaterialVersions";
import type { MaterialDetail } from "@/lib/schemas/materialViews";
import { materialChanges } from "@/lib/schemas/materialChanges";

export async function materialDetail(db: Connection, id: string): Promise<MaterialDetail | undefined> {
  const row = await findMaterial(db, id);
  if (!row) return undefined;
  const versions = await findMaterialVersions(db, { materialId: id });
  const uses = await countMaterialUses(db, id);
  return {
    ...uses,
    material: materialView(row),
    versions: versions.map((made, index) => {
      const before = versions[index + 1];
      return {
        id: made.id, version: made.version, facts: made.facts, note: made.note, at: made.created_at.toISOString(), by: made.created_by ?? "",
        changes: before ? materialChanges(before.facts, made.facts) : [],
      };
    }),
  };
}
