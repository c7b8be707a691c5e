import { randomUUID } from "node:crypto";
import type { z } from "zod";
import { importCsv } from "../csv/importCsv";
import { foundAgain } from "../foundAgain";
import { recordEvent } from "../recordEvent";
import { entryContext } from "./entryContext";
import { entryOfCsv } from "./entryOfCsv";
import { existingTrials } from "./existingTrials";
import { newTrial } from "./newTrial";
import { trialImportRules } from "./trialImportRules";
import type { Result } from "@/bending/core/result";
import { findAllTrials } from "@/db/bendTrials/findAllTrials";
import { insertTrials } from "@/db/bendTrials/insertTrials";
import { database } from "@/db/client";
import type { Failure } from "@/lib/api/failure";
import type { SignedInPerson } from "@/lib/auth/signedInPerson";
import type { CsvImportAnswer, csvImportSchema } from "@/lib/schemas/csvImport";

/** Trials out of a file: what each line would do, or with `confirm` the writing of it. */
export async function importTrials(person: SignedInPerson, input: z.output<typeof csvImportSchema>): Promise<Result<CsvImportAnswer, Failure>> {
  const context = await entryContext(database(), "mm");
  return importCsv(input, {
    ...trialImportRules(context),
    lock: async (within) => { await within.raw("lock table bend_trials in share row exclusive mode"); },
    load: async (within) => existingTrials(await findAllTrials(within, { withdrawn: true })),
    write: async (within, writes) => {
      const lines = writes.map(({ after }) => entryOfCsv(after, context.instruments, randomUUID()));
      await insertTrials(within, lines.map((line) => newTrial(line, "mm", foundAgain(context.materials(line.material)))), person.id);
      const materials = [...new Set(lines.map(({ material }) => material))].join(", ");
      await recordEvent(within, person, "imported bend trials", `${lines.length} of ${materials}`, input.fileName);
    },
  });
}
