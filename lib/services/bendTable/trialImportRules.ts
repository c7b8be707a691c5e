import { csvKey } from "./csvKey";
import { entryOfCsv } from "./entryOfCsv";
import { entryProblems, type EntryContext } from "./entryProblems";
import { ok } from "@/bending/core/result";
import type { CsvColumn } from "@/lib/csv/csvColumn";
import { optionalColumn } from "@/lib/csv/optionalColumn";
import { textColumn } from "@/lib/csv/textColumn";
import type { CsvImportRules } from "@/lib/csv/dryRunCsv";
import { bendTrialCsv } from "@/lib/schemas/bendTrialCsv";

/** What a file of trials may do: add trials. One that is there stays as it was measured, so a line that says otherwise is refused. */
export function trialImportRules(context: EntryContext): CsvImportRules<typeof bendTrialCsv> {
  const names = [...context.instruments.values()].map(({ name }) => name);
  return {
    columns: {
      ...bendTrialCsv,
      lengthInstrument: namedAs(names, bendTrialCsv.lengthInstrument),
      thicknessInstrument: optionalColumn(namedAs(names, textColumn("thickness instrument", 80))),
      angleInstrument: namedAs(names, bendTrialCsv.angleInstrument),
      radiusInstrument: optionalColumn(namedAs(names, textColumn("radius instrument", 80))),
    },
    keyOf: csvKey,
    labelOf: ({ number, material, thickness, vOpening, angle }) => number ?? [material, thickness === undefined ? null : `${Number(thickness.toPrecision(4))} mm`, vOpening === undefined ? null : `V ${Number(vOpening.toPrecision(4))}`, angle === undefined ? null : `${angle}°`].filter(Boolean).join(", "),
    blank: { number: null, batch: null, nominal: null, insideRadius: null, thicknessInstrument: null, radiusInstrument: null, note: null },
    check: (row, before) => {
      if (before !== undefined) return [{ field: "number", message: `is on record with other values, and what was measured does not change. Withdraw ${before.number ?? "it"} if it is wrong, and give the right one on a line without a number` }];
      if (row.number !== null) return [{ field: "number", message: "is the number of no trial. Leave it empty for a new one: the shop numbers it" }];
      return entryProblems(entryOfCsv(row, context.instruments), context).map(({ path, message }) => ({ field: fieldOf(path), message }));
    },
  };
}

/** Names are read whatever their case, and kept as the shop writes them. A trial on record may name one that is no longer in use. */
const namedAs = (names: readonly string[], column: CsvColumn<string>): CsvColumn<string> => ({
  ...column,
  read: (cell, how) => {
    const read = column.read(cell, how);
    return read.ok ? ok(names.find((name) => name.toLowerCase() === read.value.toLowerCase()) ?? read.value) : read;
  },
});

const fieldOf = (path: string): keyof typeof bendTrialCsv => (path in bendTrialCsv ? (path as keyof typeof bendTrialCsv) : "material");
