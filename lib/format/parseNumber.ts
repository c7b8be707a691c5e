import { fail, ok, type Result } from "@/bending/core/result";
import { spellSigns } from "./spellSigns";

const whole = /^[+-]?\d+$/;
const decimal = /^[+-]?(\d+[.,]?\d*|[.,]\d+)$/;
const fraction = /^([+-]?)(?:(\d+)(?:\s+|-))?(\d+)\s*\/\s*(\d+)$/;

/** A number as people type it: `12`, `12.5`, `12,5`, `1/8`, `3 1/2`, `3-1/2`, `3½`. A comma is a decimal comma. */
export function parseNumber(text: string): Result<number, string> {
  const plain = spellSigns(text);
  if (plain === "") return fail("Type a number.");
  if (whole.test(plain) || decimal.test(plain)) return ok(Number(plain.replace(",", ".")));
  const parts = fraction.exec(plain);
  if (parts === null) return fail(`"${text.trim()}" is not a number. Type it as 12.5 or 3 1/2.`);
  const below = Number(parts[4]);
  if (below === 0) return fail(`"${text.trim()}" divides by zero.`);
  const value = Number(parts[2] ?? 0) + Number(parts[3]) / below;
  return ok(parts[1] === "-" ? -value : value);
}
