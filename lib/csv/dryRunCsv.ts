import { createHash } from "node:crypto";
import type { CsvColumns, CsvRow } from "./csvColumn";
import type { CellProblem, CsvFault, CsvLine } from "./csvTable";
import { fieldChanges } from "./fieldChanges";
import { headingOf } from "./headingOf";
import { readCsv } from "./readCsv";
import { tableNotes } from "./tableNotes";
import { ok, type Result } from "@/bending/core/result";
import type { CsvDryRun, CsvLineFate, LineFate } from "@/lib/schemas/csvImport";

/** An entry as it stands in the shop. */
export interface Existing<Row> {
  readonly key: string;
  readonly row: Row;
  /** Changes with every change of the entry, e.g. its version: a confirmation is refused when it is another by then. */
  readonly stamp: string;
}

export interface CsvImportRules<Columns extends CsvColumns> {
  readonly columns: Columns;
  /** Which entry a line is about; undefined: a new one each time. */
  readonly keyOf: (values: Partial<CsvRow<Columns>>) => string | undefined;
  readonly labelOf: (values: Partial<CsvRow<Columns>>) => string;
  /** What a new entry has in the columns that the file does not have. A column named in neither is refused as missing. */
  readonly blank: Partial<CsvRow<Columns>>;
  /** What follows from what the file says, to be shown and written like it (before what is compared). */
  readonly adjust?: (given: Partial<CsvRow<Columns>>, before: CsvRow<Columns> | undefined) => Partial<CsvRow<Columns>>;
  /** What is wrong with the whole entry: field by field, in the words of the column's unit. */
  readonly check: (row: CsvRow<Columns>, before: CsvRow<Columns> | undefined) => readonly { readonly field: keyof Columns; readonly message: string }[];
}

/** An entry to be written, once it is confirmed. */
export interface CsvWrite<Row> {
  readonly line: number;
  readonly before: Row | undefined;
  readonly after: Row;
}

export interface CsvDecision<Row> {
  readonly dryRun: CsvDryRun;
  readonly writes: readonly CsvWrite<Row>[];
}

/** What every line of a file would do to the entries that there are: add, change, nothing, or why it is refused. Writes nothing. */
export function dryRunCsv<Columns extends CsvColumns>(
  text: string, rules: CsvImportRules<Columns>, existing: readonly Existing<CsvRow<Columns>>[],
): Result<CsvDecision<CsvRow<Columns>>, CsvFault> {
  const table = readCsv(text, rules.columns);
  if (!table.ok) return table;
  const byKey = new Map(existing.map((entry) => [entry.key, entry]));
  const lineOfKey = new Map<string, number>();
  const decided = table.value.lines.map((line) => {
    const key = rules.keyOf(line.values);
    const before = key === undefined ? undefined : byKey.get(key);
    const earlier = key === undefined ? undefined : lineOfKey.get(key);
    if (key !== undefined && earlier === undefined) lineOfKey.set(key, line.line);
    const twice: readonly CellProblem[] = earlier === undefined ? [] : [{ field: "", given: rules.labelOf(line.values), message: `is the entry of line ${earlier} already; keep one of the two` }];
    return { stamp: before?.stamp ?? "", ...decide(rules, line, before?.row, [...line.problems, ...twice]) };
  });
  const lines = decided.map(({ fate }) => fate);
  const counts = { add: 0, change: 0, same: 0, refused: 0 } satisfies Record<LineFate, number>;
  for (const { fate } of lines) counts[fate] += 1;
  const digest = createHash("sha256").update(JSON.stringify([text, lines, decided.map(({ stamp }) => stamp)])).digest("hex");
  return ok({ dryRun: { lines, counts, notes: tableNotes(table.value), digest }, writes: decided.flatMap(({ write }) => (write === undefined ? [] : [write])) });
}

function decide<Columns extends CsvColumns>(
  rules: CsvImportRules<Columns>, { line, values }: CsvLine<Columns>, before: CsvRow<Columns> | undefined, found: readonly CellProblem[],
): { readonly fate: CsvLineFate; readonly write?: CsvWrite<CsvRow<Columns>> } {
  const { columns } = rules;
  const label = rules.labelOf(values);
  const refused = (problems: readonly CellProblem[]) => ({ fate: { line, label, fate: "refused", changes: [], problems } satisfies CsvLineFate });
  if (found.length > 0) return refused(found);
  const told = before === undefined ? { ...rules.blank, ...values } : values;
  const given = rules.adjust?.(told, before) ?? told;
  const changes = fieldChanges(columns, given, before);
  const after = { ...(before ?? rules.blank), ...Object.fromEntries(changes.map(({ key }) => [key, given[key]])) } as CsvRow<Columns>;
  const missing = Object.keys(columns).filter((key) => after[key] === undefined);
  if (missing.length > 0) {
    return refused(missing.map((key) => ({ field: headingOf(columns[key]!), given: "", message: `must be given for a new entry: ${columns[key]!.expects}` })));
  }
  if (before !== undefined && changes.length === 0) return { fate: { line, label, fate: "same", changes: [], problems: [] } };
  const problems = rules.check(after, before).map(({ field, message }) => {
    const column = columns[field];
    const value = column?.write(after[field]);
    return { field: column === undefined ? String(field) : headingOf(column), given: value === undefined ? "" : String(value), message };
  });
  if (problems.length > 0) return refused(problems);
  const shown = changes.map(({ field, from, to }) => ({ field, from, to }));
  return { fate: { line, label, fate: before === undefined ? "add" : "change", changes: shown, problems: [] }, write: { line, before, after } };
}

