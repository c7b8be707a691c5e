import type { CsvColumns, CsvRow, DecimalSign } from "./csvColumn";

/** A cell that was not taken: under which heading, what stands there, what would be right. */
export interface CellProblem {
  readonly field: string;
  readonly given: string;
  readonly message: string;
}

export interface CsvLine<Columns extends CsvColumns> {
  /** In the file, from 1, where the entry begins. */
  readonly line: number;
  /** What could be read; a column that the file does not have is not there. */
  readonly values: Partial<CsvRow<Columns>>;
  readonly problems: readonly CellProblem[];
}

export interface CsvTable<Columns extends CsvColumns> {
  readonly lines: readonly CsvLine<Columns>[];
  readonly separator: "," | ";" | "\t";
  readonly decimal: DecimalSign;
  /** Headings that no column has; their cells were left aside. */
  readonly unknown: readonly string[];
}

/** Why a file as a whole was not read. */
export interface CsvFault {
  readonly message: string;
  readonly line?: number;
}
