import { database } from "@/db/client";
import { findMaterials } from "@/db/materials/findMaterials";
import type { MaterialView } from "@/lib/schemas/views";

export async function listMaterials(): Promise<readonly MaterialView[]> {
  return findMaterials(database());
}
