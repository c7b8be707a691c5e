import type { ColumnWords, CsvColumn } from "./csvColumn";
import { readCsvNumber } from "./readCsvNumber";
import { fail, ok } from "@/bending/core/result";

interface NumberRange extends ColumnWords {
  readonly units?: Readonly<Record<string, number>>;
  /** Exclusive lower bound; `from` is the inclusive one. In the program's unit. */
  readonly over?: number;
  readonly from?: number;
  readonly upTo?: number;
  readonly whole?: boolean;
}

/** Digits that are written and compared: a spreadsheet keeps 15, so that a file which went through one changes nothing. */
const DIGITS = 10;

export function numberColumn(header: string, range: NumberRange = {}): CsvColumn<number> {
  const unit = Object.keys(range.units ?? {})[0];
  const expects = range.expects ?? rangeWords(range, unit);
  return {
    header, expects, also: range.also ?? [], units: range.units ?? {}, required: true, numeric: true, example: range.example ?? "1",
    read(cell, { decimal, scale }) {
      const read = readCsvNumber(cell, decimal);
      if (!read.ok) return fail(`${read.error}; it must be ${expects}`);
      const value = scale === 1 ? read.value : read.value * scale;
      const within = !(range.over !== undefined && value <= range.over) && !(range.from !== undefined && value < range.from)
        && !(range.upTo !== undefined && value > range.upTo) && !(range.whole === true && !Number.isInteger(value));
      return within ? ok(value) : fail(`must be ${expects}`);
    },
    write: (value) => Number(value.toPrecision(DIGITS)),
  };
}

function rangeWords({ over, from, upTo, whole }: NumberRange, unit: string | undefined): string {
  const kind = whole === true ? "a whole number" : "a number";
  const low = over !== undefined ? ` over ${over}` : from !== undefined ? ` from ${from}` : "";
  const high = upTo === undefined ? "" : low === "" ? ` up to ${upTo}` : ` and up to ${upTo}`;
  return `${kind}${low}${high}${unit === undefined ? "" : ` ${unit}`}`;
}
