import { fail, ok, type Result } from "@/bending/core/result";

const whole = /^[+-]?\d+$/;
const decimal = /^[+-]?(\d+[.,]?\d*|[.,]\d+)$/;
const fraction = /^([+-]?)(?:(\d+)(?:\s+|-))?(\d+)\s*\/\s*(\d+)$/;
const vulgar: Readonly<Record<string, string>> = { "½": "1/2", "¼": "1/4", "¾": "3/4", "⅛": "1/8", "⅜": "3/8", "⅝": "5/8", "⅞": "7/8", "⅓": "1/3", "⅔": "2/3" };

/** A number as people type it: `12`, `12.5`, `12,5`, `1/8`, `3 1/2`, `3-1/2`, `3½`. A comma is a decimal comma. */
export function parseNumber(text: string): Result<number, string> {
  const plain = text.replace(/[½¼¾⅛⅜⅝⅞⅓⅔]/g, (sign) => ` ${vulgar[sign] ?? ""}`).replace(/[−–]/g, "-").trim();
  if (plain === "") return fail("Type a number.");
  if (whole.test(plain) || decimal.test(plain)) return ok(Number(plain.replace(",", ".")));
  const parts = fraction.exec(plain);
  if (parts === null) return fail(`"${text.trim()}" is not a number. Type it as 12.5 or 3 1/2.`);
  const below = Number(parts[4]);
  if (below === 0) return fail(`"${text.trim()}" divides by zero.`);
  const value = Number(parts[2] ?? 0) + Number(parts[3]) / below;
  return ok(parts[1] === "-" ? -value : value);
}
