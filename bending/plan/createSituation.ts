import { createClearance } from "../clearance/createClearance";
import { rad, type LengthUnit } from "../core/units";
import { springback } from "../handbook/springback";
import { collectMoves } from "../order/collectMoves";
import { createRuns } from "../setup/createRuns";
import { inRow } from "../strokes/inRow";
import type { Machine } from "../tooling/machine";
import { followsOrder } from "./followsOrder";
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
export function createSituation({ variant: { part, drawn, splits, rows, bitsOf, vOpening, everyBend }, machine, units, pairs, airForceFactor = 1, order }: SituationFacts): Situation {
  const moves = collectMoves(part);
  const runs = createRuns(machine.settings);
  const demanded = part.bends.map((bend) => springback(bend.angle, bend.insideRadius, part.thickness, part.material).angle);
  const fits = part.bends.map((bend) => pairs.map((pair) => toolFit({ part, machine, runs, units, vOpening, everyBend, airForceFactor }, bend, pair)));
  const useful = pairs.filter((_, index) => fits.some((ofBend) => ofBend[index]?.ok));
  const kept = new Set(useful.map(({ index }) => index));
  const asked = order === undefined ? null : followsOrder(order, bitsOf);
  return {
    part, drawn, splits, machine, units, moves, runs,
    pairs: useful.map((pair, index) => ({ ...pair, index })),
    fits: useful.length === 0 ? fits : fits.map((ofBend) => ofBend.filter((_, index) => kept.has(index))),
    clearance: createClearance(part, machine, { demandedAngle: (bend) => demanded[bend] ?? rad(0) }),
    allowed: (move, formed) => {
      const found = moves[move];
      return found !== undefined && inRow(rows, found.bends, formed) && (asked === null || asked(found, formed));
    },
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
