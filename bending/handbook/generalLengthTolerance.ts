import { mm, type Mm } from "../core/units";
import type { GeneralTolerance, ToleranceClass } from "./generalTolerance";

/** Upper ends of the ranges of length, mm; the first range starts at 0.5 mm. */
const LENGTHS = [3, 6, 30, 120, 400, 1000, 2000, 4000];

/** ISO 2768-1 table 1. f and m second-hand; c and v from memory, since copies contradict each other. */
const LINEAR: Record<ToleranceClass, readonly (number | null)[]> = {
  f: [0.05, 0.05, 0.1, 0.15, 0.2, 0.3, 0.5, null],
  m: [0.1, 0.1, 0.2, 0.3, 0.5, 0.8, 1.2, 2],
  c: [0.2, 0.3, 0.5, 0.8, 1.2, 2, 3, 4],
  v: [null, 0.5, 1, 1.5, 2.5, 4, 6, 8],
};

/** General tolerance of a length (ISO 2768-1 table 1). Null where the class has no entry. */
export function generalLengthTolerance(name: ToleranceClass, length: Mm): GeneralTolerance<Mm> | null {
  const value = length < 0.5 ? null : LINEAR[name][LENGTHS.findIndex((upTo) => length <= upTo)];
  return typeof value === "number" ? { deviation: mm(value), source: `ISO 2768-1, class ${name}`, seen: name === "f" || name === "m" } : null;
}
