import { deg, type Deg, type Mm } from "../core/units";
import type { GeneralTolerance, ToleranceClass } from "./generalTolerance";

/** Upper ends of the ranges of the shorter side, mm. */
const SIDES = [10, 50, 120, 400, Infinity];

/** ISO 2768-1 table 3, minutes. f and m second-hand; c and v seen in part. */
const ANGULAR: Record<ToleranceClass, readonly number[]> = {
  f: [60, 30, 20, 10, 5], m: [60, 30, 20, 10, 5], c: [90, 60, 30, 15, 10], v: [180, 120, 60, 30, 20],
};

/** General tolerance of an angle by the length of its shorter side (ISO 2768-1 table 3). */
export function generalAngleTolerance(name: ToleranceClass, shorterSide: Mm): GeneralTolerance<Deg> | null {
  const minutes = ANGULAR[name][SIDES.findIndex((upTo) => shorterSide <= upTo)];
  return minutes === undefined ? null : { deviation: deg(minutes / 60), source: `ISO 2768-1, class ${name}`, seen: name === "f" || name === "m" };
}
