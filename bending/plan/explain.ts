import type { StepChecks } from "./createStepChecks";
import { neverFits } from "./neverFits";
import type { PlanReason } from "./planDocument";
import type { Situation } from "./situation";
import { stopsOf } from "./stopsOf";

/** Pairs looked at for a reason: the likeliest ones. */
export const PAIRS_EXPLAINED = 12;

/**
 * Why no order works: bends that no tool fits, whatever the order; else, for the fullest set of formed bends
 * that can be reached, what stops each of the others, said of the tool that comes nearest.
 */
export function explain(situation: Situation, checks: StepChecks, formed: number): readonly PlanReason[] {
  const always = situation.part.bends.flatMap((_, bend) => neverFits(situation, bend));
  if (always.length > 0) return always;
  const seen = new Set<string>();
  const reasons: PlanReason[] = [];
  situation.part.bends.forEach((_, bend) => {
    if ((formed >> bend) & 1) return;
    const moves = situation.moves.flatMap((move, index) => (move.bends.includes(bend) && !(move.mask & formed) ? [index] : []));
    const findings = moves.flatMap((move) => situation.pairs.slice(0, PAIRS_EXPLAINED).flatMap(({ index }) => stopsOf(situation, checks, move, formed, index).slice(0, 1)));
    const nearest = findings.sort((a, b) => a.off - b.off)[0];
    if (nearest === undefined || seen.has(nearest.reason.message)) return;
    seen.add(nearest.reason.message);
    reasons.push(nearest.reason);
  });
  return reasons;
}
