import type { Connection } from "@/db/connection";
import { findMaterials } from "@/db/materials/findMaterials";
import type { MaterialLookup } from "@/bending/handbook/material";

/** The shop's materials by id. */
export async function materialLookup(db: Connection): Promise<MaterialLookup> {
  const byId = new Map((await findMaterials(db)).map((material) => [material.id, material]));
  return (id) => byId.get(id);
}
