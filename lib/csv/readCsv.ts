import type { CsvColumns, CsvRow, DecimalSign } from "./csvColumn";
import { csvLimits } from "./csvLimits";
import type { CellProblem, CsvFault, CsvLine, CsvTable } from "./csvTable";
import { matchHeadings, type Heading } from "./matchHeadings";
import { parseCells, type Cells } from "./parseCells";
import { recogniseSeparator } from "./recogniseSeparator";
import { fail, ok, type Result } from "@/bending/core/result";

/**
 * Reads a CSV file: separated by `,` or `;` or tab, with or without the mark of UTF-8, any line ends, quoted values,
 * headings in any order and case with their unit in brackets. With `;` or tab, decimals may have a comma.
 * A fault is of the file as a whole; what is wrong with one cell stands at its line.
 */
export function readCsv<Columns extends CsvColumns>(text: string, columns: Columns): Result<CsvTable<Columns>, CsvFault> {
  if (new TextEncoder().encode(text).byteLength > csvLimits.bytes) return fail({ message: `The file is larger than ${csvLimits.bytes / 1_000_000} MB, which is the most that is read at once. Split it.` });
  const { body, separator } = recogniseSeparator(text, columns);
  const parsed = parseCells(body, separator);
  if (!parsed.ok) return parsed;
  const [head, ...lines] = parsed.value;
  if (head === undefined) return fail({ message: "There is nothing in it. The first line names the columns, each line after it is one entry." });
  if (lines.length === 0) return fail({ message: "There is only a line of headings in it, and no entry.", line: head.line });
  if (lines.length > csvLimits.lines) return fail({ message: `It has ${lines.length} entries; at most ${csvLimits.lines} are read at once. Split the file.` });
  const { headings, problems } = matchHeadings(columns, head.cells);
  if (problems.length > 0) return fail({ message: problems.join(" "), line: head.line });
  const decimal = separator === "," ? "." : decimalOf(columns, headings, lines);
  return ok({
    separator, decimal,
    unknown: headings.flatMap(({ key, text: words }) => (key === undefined && words !== "" ? [words] : [])),
    lines: lines.map((line) => readLine(columns, headings, line, decimal)),
  });
}

/** A comma as soon as one number of the file has one. */
function decimalOf(columns: CsvColumns, headings: readonly Heading[], lines: readonly Cells[]): DecimalSign {
  const numeric = headings.flatMap(({ key }, index) => (key !== undefined && columns[key]?.numeric === true ? [index] : []));
  return lines.some(({ cells }) => numeric.some((index) => /^[+-]?\d*,\d+$/.test(cells[index] ?? ""))) ? "," : ".";
}

function readLine<Columns extends CsvColumns>(columns: Columns, headings: readonly Heading[], { line, cells }: Cells, decimal: DecimalSign): CsvLine<Columns> {
  const problems: CellProblem[] = [];
  const values: Record<string, unknown> = {};
  if (cells.slice(headings.length).some((cell) => cell !== "")) {
    problems.push({ field: "", given: `${cells.length} values`, message: `must have ${headings.length} values like the headings; a value that has the separator in it stands in quotation marks` });
  }
  headings.forEach(({ key, text, scale }, index) => {
    const column = key === undefined ? undefined : columns[key];
    if (key === undefined || column === undefined) return;
    const cell = cells[index] ?? "";
    const read = cell === "" && column.required ? fail(`must not be empty; it must be ${column.expects}`) : column.read(cell, { decimal, scale });
    if (read.ok) values[key] = read.value;
    else problems.push({ field: text, given: cell, message: read.error });
  });
  return { line, values: values as Partial<CsvRow<Columns>>, problems };
}
