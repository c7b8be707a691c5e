import type { MaterialFacts } from "@/bending/handbook/material";
import type { Connection } from "../connection";
import { materialColumns } from "./materialColumns";

export type VersionInserted =
  | { readonly kind: "inserted"; readonly version: number }
  | { readonly kind: "stale"; readonly latest: number }
  | { readonly kind: "no-material" };

/** The next version of a material, unless another was made after `basedOn`. Its id stays. */
export async function insertMaterialVersion(
  db: Connection, basedOn: number, facts: MaterialFacts, record: { readonly note: string; readonly by: string | null },
): Promise<VersionInserted> {
  return db.transaction(async (within): Promise<VersionInserted> => {
    const row = await within("materials").where({ id: facts.id }).forUpdate().first<{ version: number } | undefined>("version");
    if (!row) return { kind: "no-material" };
    if (row.version !== basedOn) return { kind: "stale", latest: row.version };
    const version = basedOn + 1;
    await within("materials").where({ id: facts.id }).update({ ...materialColumns(facts), version });
    await within("material_versions").insert({ material_id: facts.id, version, facts: JSON.stringify(facts), note: record.note, created_by: record.by });
    return { kind: "inserted", version };
  });
}
