import { deg, mm, toRad, type Mm } from "@/bending/core/units";
import type { DieOpening } from "@/bending/handbook/dieOpening";

/** A V of that size whose size is taken in the given way. */
export function readDie(measured: DieOpening["measured"], opening: Mm, number: (key: "sh" | "da") => number): DieOpening {
  const shoulderRadius = mm(number("sh"));
  return measured === "between-tops" ? { measured, opening, shoulderRadius } : { measured, opening, shoulderRadius, dieAngle: toRad(deg(number("da"))) };
}
