import type { MaterialFacts } from "@/bending/handbook/material";
import type { Connection } from "@/db/connection";
import { findMaterials } from "@/db/materials/findMaterials";
import { findMaterialVersions } from "@/db/materials/findMaterialVersions";
import { materialChanges } from "@/lib/schemas/materialChanges";
import type { MaterialDrift } from "@/lib/schemas/materialViews";

/** What a plan keeps of its material; `findPlan` gives both. */
export interface MadeWith {
  readonly material: MaterialFacts;
  readonly material_version_id: string | null;
}

/**
 * For each thing made: which version of its material it was made with, which is the newest, and which of the values that
 * calculations use are another now. In the order given; `null` where the shop does not know the material (any more).
 * A screen flags what has `changes`: "made with S235 version 2, version 3 now: yield (MPa) 235, now 240".
 */
export async function materialDrifts(db: Connection, made: readonly MadeWith[]): Promise<readonly (MaterialDrift | null)[]> {
  if (made.length === 0) return [];
  const now = new Map((await findMaterials(db, { ids: [...new Set(made.map(({ material }) => material.id))] })).map((row) => [row.id, row]));
  const ids = [...new Set(made.flatMap(({ material_version_id: id }) => id ?? []))];
  const numbers = new Map((ids.length === 0 ? [] : await findMaterialVersions(db, { ids })).map((version) => [version.id, version.version]));
  return made.map(({ material, material_version_id: id }) => {
    const row = now.get(material.id);
    if (!row) return null;
    return {
      materialId: material.id,
      madeWith: id === null ? null : (numbers.get(id) ?? null),
      now: row.version,
      changes: materialChanges(material, row.facts, false),
      withdrawn: row.withdrawn_at !== null,
    };
  });
}
