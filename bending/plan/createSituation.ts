import { withHems } from "../clearance/withHems";
import { rad, type LengthUnit, type Rad } from "../core/units";
import type { PartModel } from "../part/partModel";
import { collectMoves, type Move } from "../order/collectMoves";
import { createFingerAgainstTools } from "../setup/createFingerAgainstTools";
import { createRuns } from "../setup/createRuns";
import { acuteStage } from "../strokes/acuteHem";
import { inRow } from "../strokes/inRow";
import type { Machine } from "../tooling/machine";
import type { Die } from "../tooling/tool";
import type { BendWish } from "./bendWish";
import { followsOrder } from "./followsOrder";
import { heedWishes } from "./heedWishes";
import { overbent } from "./overbent";
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
  /** What a person asks of single bends. */
  readonly wishes?: readonly BendWish[] | undefined;
}

/** Joins part, machine and tools; the clearance asks for the angle that each stroke really goes to. */
export function createSituation({ variant: { part, drawn, splits, rows, bitsOf, vOpening, everyBend }, machine, units, pairs, airForceFactor = 1, order, wishes = [] }: SituationFacts): Situation {
  const moves = collectMoves(part);
  const runs = createRuns(machine.settings);
  const demanded = part.bends.map((bend) => overbent(part, bend));
  const demandedAngle = (index: number, die: Die): Rad => {
    const bend = part.bends[index];
    return bend?.hem ? overbent(part, acuteStage(part, bend, die.vOpening)) : demanded[index] ?? rad(0);
  };
  const heeded = heedWishes(part, drawn, wishes);
  const fits = part.bends.map((bend, index) => pairs.map((pair): ToolFit => {
    const problem = heeded.misfit(index, pair);
    return problem ? { ok: false, problem } : toolFit({ part, machine, runs, units, vOpening, everyBend, airForceFactor }, bend, pair);
  }));
  const useful = pairs.filter((_, index) => fits.some((ofBend) => ofBend[index]?.ok));
  const kept = new Set(useful.map(({ index }) => index));
  const asked = order === undefined ? null : followsOrder(order, bitsOf);
  return {
    part, drawn, splits, machine, units, moves, runs,
    pairs: useful.map((pair, index) => ({ ...pair, index })),
    fits: useful.length === 0 ? fits : fits.map((ofBend) => ofBend.filter((_, index) => kept.has(index))),
    clearance: withHems(part, machine, { demandedAngle }),
    fingers: createFingerAgainstTools(machine),
    allowed: (move, formed) => {
      const found = moves[move];
      return found !== undefined && hemsHeldInFront(part, found) && inRow(rows, found.bends, formed) && (asked === null || asked(found, formed)) && heeded.frontAllowed(found);
    },
  };
}

/** A hem goes into the slot from the front: the sheet that it is bent from stays in the operator's hands. */
const hemsHeldInFront = ({ bends }: PartModel, move: Move): boolean => move.bends.every((index) => bends[index]?.hem === null || bends[index]?.parent === move.front);

/** The same with fewer pairs. */
export function withPairs(situation: Situation, chosen: readonly ToolPair[]): Situation {
  return {
    ...situation,
    pairs: chosen.map((pair, index) => ({ ...pair, index })),
    fits: situation.fits.map((ofBend) => chosen.map(({ index }) => ofBend[index] as ToolFit)),
  };
}
