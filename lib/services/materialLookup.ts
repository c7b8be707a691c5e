import type { Connection } from "@/db/connection";
import { findMaterials } from "@/db/materials/findMaterials";
import type { MaterialLookup } from "@/bending/handbook/material";

/** The shop's materials by id, withdrawn ones too: what was made of them still is. */
export async function materialLookup(db: Connection): Promise<MaterialLookup> {
  const byId = new Map((await findMaterials(db)).map(({ id, facts }) => [id, facts]));
  return (id) => byId.get(id);
}
