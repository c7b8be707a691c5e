import type { FieldProblem } from "../core/problem";
import { mmPer, type LengthUnit } from "../core/units";
import { formatLength } from "../core/formatLength";
import { PART_LIMITS } from "./partLimits";

const NO_LENGTH = new Set(["angle", "kFactor", "edge", "startAngle", "endAngle", "toleranceAngle"]);

/** Lengths far beyond any sheet, wherever they stand in the document; they are slips of the keyboard or of the unit. */
export function checkLengths(value: unknown, units: LengthUnit, path = "", key = ""): readonly FieldProblem[] {
  if (typeof value === "number") {
    const limit = key === "thickness" ? PART_LIMITS.thickness : PART_LIMITS.length;
    if (NO_LENGTH.has(key) || Math.abs(value) * mmPer(units) <= limit) return [];
    return [{ path, message: `${value} ${units} is beyond what is taken here; it must be at most ${formatLength(limit, units)}` }];
  }
  if (Array.isArray(value)) return value.flatMap((entry: unknown, i) => checkLengths(entry, units, `${path}[${i}]`, key));
  if (typeof value !== "object" || value === null) return [];
  return Object.entries(value).flatMap(([name, entry]) => checkLengths(entry, units, path ? `${path}.${name}` : name, name));
}
