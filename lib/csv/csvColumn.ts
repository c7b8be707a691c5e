import type { Result } from "@/bending/core/result";

/** How the numbers of a file are written. */
export type DecimalSign = "." | ",";

/**
 * One column, the same for reading and writing. `Value` is what the program holds; a column that may be empty has
 * `null` for it. Made by `textColumn`, `numberColumn`, `choiceColumn`, `dateColumn` and `optionalColumn`.
 */
export interface CsvColumn<Value> {
  /** Lower-case words without the unit, e.g. "thickness". Read whatever its case, with spaces, `_` or `-`. */
  readonly header: string;
  /** Other words that are read as the same heading. */
  readonly also: readonly string[];
  /** How much of the program's unit one of each is: `{ mm: 1, in: 25.4 }`. The first is written. Empty: no unit. */
  readonly units: Readonly<Record<string, number>>;
  /** The column must be there, and no cell may be empty. */
  readonly required: boolean;
  /** Cells are numbers: they decide whether the file has decimal commas. */
  readonly numeric: boolean;
  /** What would be right, e.g. "a number over 0". Shown beside a refused cell and in the list of columns. */
  readonly expects: string;
  /** A cell that is right, for the template. */
  readonly example: string;
  /** A trimmed cell; `scale` is of the unit that the heading gives. The error says what would be right. */
  read(cell: string, how: { readonly decimal: DecimalSign; readonly scale: number }): Result<Value, string>;
  write(value: Value): string | number;
}

export type CsvColumns = Readonly<Record<string, CsvColumn<unknown>>>;

export type CsvRow<Columns extends CsvColumns> = { readonly [Key in keyof Columns]: Columns[Key] extends CsvColumn<infer Value> ? Value : never };

/** What a column says beyond what its kind says. */
export interface ColumnWords {
  readonly also?: readonly string[];
  readonly expects?: string;
  readonly example?: string;
}
