import type { MaterialFacts } from "@/bending/handbook/material";
import type { Connection } from "../connection";

/** Puts materials in, or brings the facts of known ones up to date. */
export async function upsertMaterials(db: Connection, materials: readonly MaterialFacts[]): Promise<void> {
  if (materials.length === 0) return;
  await db("materials")
    .insert(materials.map((material) => ({
      id: material.id,
      name: material.name,
      material_group: material.group,
      standard: material.standard,
      facts: JSON.stringify(material),
    })))
    .onConflict("id")
    .merge(["name", "material_group", "standard", "facts"]);
}
