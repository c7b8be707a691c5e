import type { z } from "zod";
import { importCsv } from "../csv/importCsv";
import { recordEvent } from "../recordEvent";
import { materialImportRules } from "./materialImportRules";
import { invariant } from "@/bending/core/invariant";
import type { Result } from "@/bending/core/result";
import { findMaterials } from "@/db/materials/findMaterials";
import { insertMaterial } from "@/db/materials/insertMaterial";
import { insertMaterialVersion } from "@/db/materials/insertMaterialVersion";
import type { Failure } from "@/lib/api/failure";
import type { SignedInPerson } from "@/lib/auth/signedInPerson";
import type { CsvImportAnswer, csvImportSchema } from "@/lib/schemas/csvImport";
import { materialOfCsv } from "@/lib/schemas/materialOfCsv";
import { materialToCsv } from "@/lib/schemas/materialToCsv";

/** Materials out of a table: what each line would do, or with `confirm` the writing of it, each change as a new version. */
export async function importMaterials(person: SignedInPerson, input: z.output<typeof csvImportSchema>): Promise<Result<CsvImportAnswer, Failure>> {
  const rules = materialImportRules(input.fileName);
  const versions = new Map<string, number>();
  return importCsv(input, {
    ...rules,
    lock: async (within) => { await within.raw("lock table materials in share row exclusive mode"); },
    load: async (within) => (await findMaterials(within)).map(({ id, facts, version }) => {
      versions.set(id, version);
      return { key: id, row: materialToCsv(facts), stamp: String(version) };
    }),
    write: async (within, writes) => {
      const record = { note: rules.unsaid.text, by: person.id };
      for (const { before, after } of writes) {
        const facts = materialOfCsv(after, rules.unsaid);
        if (before === undefined) await insertMaterial(within, facts, record);
        else {
          const made = await insertMaterialVersion(within, versions.get(facts.id) ?? 0, facts, record);
          invariant(made.kind === "inserted", "a locked material is as it was read");
        }
      }
      await recordEvent(within, person, "imported materials", `${writes.length} of them`, [input.fileName, writes.map(({ after }) => after.id).join(", ").slice(0, 400)].filter((text) => text !== "").join(": "));
    },
  });
}
