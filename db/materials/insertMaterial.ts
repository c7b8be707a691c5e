import type { MaterialFacts } from "@/bending/handbook/material";
import type { Connection } from "../connection";
import { materialColumns } from "./materialColumns";

/** A new material with its first version, both or neither. */
export async function insertMaterial(db: Connection, facts: MaterialFacts, record: { readonly note: string; readonly by: string | null }): Promise<void> {
  await db.transaction(async (within) => {
    await within("materials").insert({ id: facts.id, ...materialColumns(facts) });
    await within("material_versions").insert({ material_id: facts.id, version: 1, facts: JSON.stringify(facts), note: record.note, created_by: record.by });
  });
}
