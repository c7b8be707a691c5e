import type { z } from "zod";
import { fail, ok, type Result } from "@/bending/core/result";
import { database } from "@/db/client";
import type { Connection } from "@/db/connection";
import type { Failure } from "@/lib/api/failure";
import type { CsvColumns, CsvRow } from "@/lib/csv/csvColumn";
import { dryRunCsv, type CsvImportRules, type CsvWrite, type Existing } from "@/lib/csv/dryRunCsv";
import type { CsvImportAnswer, csvImportSchema } from "@/lib/schemas/csvImport";

export interface CsvImportSteps<Columns extends CsvColumns> extends CsvImportRules<Columns> {
  /** Before a confirmed import reads: keeps others from changing these entries until the transaction ends. */
  readonly lock: (within: Connection) => Promise<void>;
  readonly load: (within: Connection) => Promise<readonly Existing<CsvRow<Columns>>[]>;
  /** All of it, in the transaction, with its audit event. */
  readonly write: (within: Connection, writes: readonly CsvWrite<CsvRow<Columns>>[]) => Promise<void>;
}

/**
 * A dry run, or with `confirm` the writing of what a dry run promised: all of it in one transaction, and nothing when the
 * entries have changed since, when the file is another one, or when a line is refused that was not to be left out.
 */
export async function importCsv<Columns extends CsvColumns>(input: z.output<typeof csvImportSchema>, steps: CsvImportSteps<Columns>): Promise<Result<CsvImportAnswer, Failure>> {
  const { text, confirm } = input;
  return database().transaction(async (within): Promise<Result<CsvImportAnswer, Failure>> => {
    if (confirm) await steps.lock(within);
    const decision = dryRunCsv(text, steps, await steps.load(within));
    if (!decision.ok) {
      const { message, line } = decision.error;
      const said = line === undefined ? message : `Line ${line}: ${message}`;
      return fail({ kind: "invalid", message: `The file was not read. ${said}`, errors: [{ path: "text", message: said }] });
    }
    const { dryRun, writes } = decision.value;
    if (!confirm) return ok({ written: false, dryRun });
    if (confirm.digest !== dryRun.digest) return conflict("What is in the shop, or the file, has changed since the dry run. Nothing was written. Look at a new dry run and confirm that one.");
    if (dryRun.counts.refused > 0 && !confirm.leaveOutRefused) return conflict(`${dryRun.counts.refused} of the lines are refused. Nothing was written. Mend them, or say that they are to be left out.`);
    if (writes.length > 0) await steps.write(within, writes);
    return ok({ written: true, dryRun });
  });
}

const conflict = (message: string) => fail<Failure>({ kind: "conflict", message });
