import { createClearance } from "../clearance/createClearance";
import { rad, type LengthUnit } from "../core/units";
import { springback } from "../handbook/springback";
import { collectMoves } from "../order/collectMoves";
import { createRuns } from "../setup/createRuns";
import type { Machine } from "../tooling/machine";
import type { PartVariant } from "./partVariants";
import type { Situation, ToolFit } from "./situation";
import { toolFit } from "./toolFit";
import type { ToolPair } from "./toolPair";

export interface SituationFacts {
  readonly variant: PartVariant;
  readonly machine: Machine;
  readonly units: LengthUnit;
  readonly pairs: readonly ToolPair[];
  /** What the formula's air-bend force is multiplied by; 1 unless said. */
  readonly airForceFactor?: number | undefined;
  /** Bends of each stroke in the order that a person asks for; absent when the planner is free. */
  readonly order?: readonly number[];
}

/** Joins part, machine and tools; the clearance asks for the angle that each stroke really goes to. */
export function createSituation({ variant: { part, vOpening, everyBend }, machine, units, pairs, airForceFactor = 1, order }: SituationFacts): Situation {
  const moves = collectMoves(part);
  const runs = createRuns(machine.settings);
  const demanded = part.bends.map((bend) => springback(bend.angle, bend.insideRadius, part.thickness, part.material).angle);
  const fits = part.bends.map((bend) => pairs.map((pair) => toolFit({ part, machine, runs, units, vOpening, everyBend, airForceFactor }, bend, pair)));
  const useful = pairs.filter((_, index) => fits.some((ofBend) => ofBend[index]?.ok));
  const kept = new Set(useful.map(({ index }) => index));
  const next = nextMask(order);
  return {
    part, machine, units, moves, runs,
    pairs: useful.map((pair, index) => ({ ...pair, index })),
    fits: useful.length === 0 ? fits : fits.map((ofBend) => ofBend.filter((_, index) => kept.has(index))),
    clearance: createClearance(part, machine, { demandedAngle: (bend) => demanded[bend] ?? rad(0) }),
    allowed: (move, formed) => next === null || next.get(formed) === moves[move]?.mask,
  };
}

/** The same with fewer pairs. */
export function withPairs(situation: Situation, chosen: readonly ToolPair[]): Situation {
  return {
    ...situation,
    pairs: chosen.map((pair, index) => ({ ...pair, index })),
    fits: situation.fits.map((ofBend) => chosen.map(({ index }) => ofBend[index] as ToolFit)),
  };
}

/** For every set of bends that the order passes through, the bends of its next stroke. */
function nextMask(order: readonly number[] | undefined): ReadonlyMap<number, number> | null {
  if (order === undefined) return null;
  const next = new Map<number, number>();
  let formed = 0;
  for (const mask of order) {
    next.set(formed, mask);
    formed |= mask;
  }
  return next;
}
