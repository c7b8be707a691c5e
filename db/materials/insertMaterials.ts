import type { MaterialFacts } from "@/bending/handbook/material";
import type { Connection } from "../connection";
import { insertMaterial } from "./insertMaterial";

/** Puts materials in, each with its first version, all or nothing. */
export async function insertMaterials(db: Connection, materials: readonly MaterialFacts[], note = ""): Promise<void> {
  await db.transaction(async (within) => {
    for (const facts of materials) await insertMaterial(within, facts, { note, by: null });
  });
}
