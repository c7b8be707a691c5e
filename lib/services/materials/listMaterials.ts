import { materialView } from "./materialView";
import { database } from "@/db/client";
import { findMaterials } from "@/db/materials/findMaterials";
import type { MaterialView } from "@/lib/schemas/materialViews";

/** All of the shop's materials, withdrawn ones too. */
export async function listMaterials(): Promise<readonly MaterialView[]> {
  return (await findMaterials(database())).map(materialView);
}
