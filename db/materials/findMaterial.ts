import type { Connection } from "../connection";
import { findMaterials } from "./findMaterials";
import type { MaterialRow } from "./materialRow";

export async function findMaterial(db: Connection, id: string): Promise<MaterialRow | undefined> {
  return (await findMaterials(db, { ids: [id] }))[0];
}
