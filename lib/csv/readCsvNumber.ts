import { fail, ok, type Result } from "@/bending/core/result";

const written = { ".": /^[+-]?(\d+\.?\d*|\.\d+)(e[+-]?\d{1,3})?$/i, ",": /^[+-]?(\d+,?\d*|,\d+)(e[+-]?\d{1,3})?$/i } as const;

/** A cell as a number. Signs between thousands are refused: 1.500 or 1,500 may mean two things. */
export function readCsvNumber(cell: string, decimal: "." | ","): Result<number, string> {
  const plain = cell.replace(/[−–]/g, "-").replace(/[\s\u00a0\u202f]/g, "");
  if (written[decimal].test(plain)) {
    const value = Number(plain.replace(",", "."));
    return Number.isFinite(value) ? ok(value) : fail("is too large a number");
  }
  const other = decimal === "." ? "," : ".";
  return written[other].test(plain)
    ? fail(`is written with "${other}", while decimals in this file are written with "${decimal}"`)
    : fail("is not a number");
}
