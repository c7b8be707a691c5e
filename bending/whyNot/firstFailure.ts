import type { PlanFailure } from "../plan/planFailure";
import { neverFits } from "../plan/neverFits";
import type { PlanReason } from "../plan/planDocument";
import type { CheckRequest, PlanRequest } from "../plan/planRequest";
import { bendsOf } from "./bendsOf";
import { failedStroke } from "./failedStroke";
import { createGround, type Ground } from "./createGround";
import { failureMessage } from "./failureMessage";
import { fullestEnd, type FullestEnd } from "./fullestEnd";
import { situationsOf, type WhySituation } from "./situationsOf";

/**
 * The first step of a person's order that cannot be made, or the fullest state that a free plan can come to, with everything that stands in the
 * way there. Steps are asked each by itself, with the bed left out, over every front and pair; null when all of them work so. `ground`: of the same part, tools and
 * wishes, kept from before: many orders are asked of one.
 */
export function firstFailure(request: PlanRequest | CheckRequest, shouldStop: () => boolean = () => false, ground: Ground = createGround(request)): PlanFailure | null {
  const { each, reasons } = situationsOf(request, ground);
  const ordered = "order" in request;
  const told = (failure: Omit<PlanFailure, "message">): PlanFailure => ({ ...failure, message: failureMessage(failure) });
  const ends: { readonly why: WhySituation; readonly end: FullestEnd }[] = [];
  for (const why of each) {
    const end = fullestEnd(why, shouldStop);
    if (end === null) return null;
    ends.push({ why, end });
  }
  const farthest = ends.reduce<(typeof ends)[number] | null>((best, one) => (best === null || one.end.way.length > best.end.way.length ? one : best), null);
  if (farthest === null) return reasons().length === 0 ? null : told({ done: [], step: ordered ? 1 : null, strokes: [unmade([], reasons())] });
  const { why, end } = farthest;
  const done = namesOf(why, end.way);
  const strokes = strokesLeft(why, end.formed).map((ways) => {
    const never = why.situation.pairs.length > 0 ? [] : (why.situation.moves[ways[0] ?? -1]?.bends ?? []).flatMap((bend) => neverFits(why.situation, bend));
    return never.length > 0 ? unmade(bendsOf(why.situation, ways[0] ?? -1), never) : failedStroke(why, ways, end.formed);
  });
  return told({ done, step: ordered ? done.length + 1 : null, strokes });
}

/** Names of strokes made one after the other; the strokes of one bend in a row are named once. */
function namesOf({ situation }: WhySituation, way: readonly number[]): readonly string[] {
  const names = way.map((move) => bendsOf(situation, move).join("+"));
  return names.filter((name, at) => name !== names[at - 1]);
}

/** The strokes that may be asked for next, each with its moves (one for each front). */
function strokesLeft({ situation: { moves, allowed }, follows }: WhySituation, formed: number): readonly (readonly number[])[] {
  const byMask = new Map<number, number[]>();
  moves.forEach(({ mask }, move) => {
    if (mask & formed || !follows(move, formed) || !allowed(move, formed)) return;
    byMask.set(mask, [...(byMask.get(mask) ?? []), move]);
  });
  return [...byMask.values()];
}

const unmade = (bends: readonly string[], reasons: readonly PlanReason[]) =>
  ({ bends, reasons: reasons.map((reason) => ({ ...reason, fronts: [], pairs: [] })), wouldWork: [] });
