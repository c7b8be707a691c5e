import { fail, ok, type Result } from "@/bending/core/result";
import { mm } from "@/bending/core/units";
import type { MinimumRadiusRow, MinimumRadiusTable } from "@/bending/handbook/material";

const entry = /^(?:up to|≤|<=)?\s*(\d+(?:[.,]\d+)?)\s*(?:mm)?\s*:\s*(\d+(?:[.,]\d+)?)\s*(t?)\s*(?:\/\s*(\d+(?:[.,]\d+)?)\s*(t?)\s*)?$/i;

export const minimumRadiiExpects = '"up to 1: 1 / 1.2; up to 1.5: 1.6 / 2" (thickness: radius across / along the rolling direction, mm; with t for multiples of the thickness)';

/** Reads what `formatMinimumRadii` writes; also without "up to", and with decimal commas. The error says what would be right. */
export function parseMinimumRadii(text: string): Result<MinimumRadiusTable, string> {
  const parts = text.split(";").map((part) => part.trim()).filter((part) => part !== "");
  const found = parts.map((part) => ({ part, match: entry.exec(part) }));
  const wrong = found.find(({ match }) => match === null);
  if (wrong || found.length === 0) return fail(`"${wrong?.part ?? text}" must be like ${minimumRadiiExpects}`);
  const number = (digits: string | undefined): number => Number((digits ?? "").replace(",", "."));
  const units = found.flatMap(({ match }) => [match?.[3], ...(match?.[4] === undefined ? [] : [match[5]])].map((unit) => unit !== ""));
  if (new Set(units).size > 1) return fail("must be all in mm or all in multiples of the thickness (t)");
  const rows = found.map(({ match }): MinimumRadiusRow => ({ upTo: mm(number(match?.[1])), across: number(match?.[2]), along: match?.[4] === undefined ? null : number(match[4]) }));
  return ok({ as: units[0] === true ? "thickness" : "mm", rows });
}
