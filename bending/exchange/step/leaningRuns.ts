import { polygonBounds } from "../../geometry/polygonBounds";
import type { Vec2 } from "../../geometry/vec2";
import type { BendEnd, BendRun } from "./unrollBend";

/** Rims on the two sides of a bend that stand less far apart are one: they are drawn with chords. */
const LEANS_MM = 0.05;

/**
 * How many of a bend's rims on its one side have none at the same place on the other: their cut is not square to the sheet. `arc` (mm)
 * is about how long the bend is across.
 */
export function leaningRuns(runs: readonly BendRun[], beneath: readonly BendRun[], arc: number): number {
  const others = beneath.map((run) => extents(run, arc));
  return runs.filter((run) => {
    const own = extents(run, arc);
    return !others.some((other) => other.every((value, i) => Math.abs(value - (own[i] ?? value)) <= LEANS_MM));
  }).length;
}

/** Least and most along the bend and across it, its ends with it. */
function extents({ from, to, path }: BendRun, arc: number): readonly number[] {
  const end = ({ on, along }: BendEnd): Vec2 => [along, on === "parent" ? 0 : arc];
  const { min, max } = polygonBounds([end(from), ...path.map(([along, turn]): Vec2 => [along, turn * arc]), end(to)]);
  return [...min, ...max];
}
