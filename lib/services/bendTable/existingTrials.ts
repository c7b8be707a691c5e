import { csvKey } from "./csvKey";
import { csvRowOf, type TrialCsvRow } from "./csvRowOf";
import type { TrialRow } from "@/db/bendTrials/trialRow";
import type { Existing } from "@/lib/csv/dryRunCsv";

/** The trials that there are, each under its number and under what it says: a line without a number is known again as well. */
export function existingTrials(rows: readonly TrialRow[]): readonly Existing<TrialCsvRow>[] {
  return rows.flatMap((row) => {
    const own = csvRowOf(row);
    const stamp = row.withdrawn_at === null ? "" : "withdrawn";
    const without = [{ ...own, number: null }, { ...own, number: null, nominal: null }];
    return [own, ...(row.withdrawn_at === null ? without : [])].map((one) => ({ key: csvKey(one), row: one, stamp }));
  });
}
