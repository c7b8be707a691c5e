import type { Hit } from "../clearance/hit";
import { bitCount } from "../order/bitCount";
import type { BlockedPattern } from "../order/createFacts";
import type { PartModel } from "../part/partModel";
import type { StepChecks } from "./createStepChecks";
import { passesFrames } from "./passesFrames";
import { roomPattern } from "./roomPattern";
import { sheetReach } from "./sheetReach";
import type { Situation } from "./situation";
import type { ToolPair } from "./toolPair";

export interface Blocked extends BlockedPattern {
  /** What stands in the way with one pair or another. */
  readonly why: readonly string[];
}

/** The runs of a pair that stand while a stroke is made, mm; Infinity when there is none. */
export type RunLengths = { readonly punch: number; readonly die: number };

/**
 * Every state in which none of some pairs can make a move for the same reasons as in this one; null when one can, or when one
 * fails for a reason that may hold nowhere else. With `runs` each tool of a pair has to find room alone on the bed too.
 */
export function blockedPattern(
  situation: Situation, checks: StepChecks, move: number, formed: number, pairs: readonly ToolPair[] = situation.pairs, runs?: (pair: number) => RunLengths | undefined,
): Blocked | null {
  const { part, machine, clearance } = situation;
  const hit = checks.hitOf(move, formed);
  const reach = sheetReach(part, hit);
  const level = levelBends(part, hit);
  const why = new Set<string>();
  const known = new Map<object, readonly BlockedPattern[]>();
  let mask = 0;
  const take = (patterns: readonly BlockedPattern[]) => {
    const added = patterns.map((pattern) => pattern.mask).sort((a, b) => bitCount(a & ~mask) - bitCount(b & ~mask));
    mask |= added[0] ?? 0;
  };
  const noRoom = (pair: ToolPair): readonly BlockedPattern[] | null => {
    const lengths = runs?.(pair.index);
    if (lengths === undefined) return null;
    why.add("room");
    if (!Number.isFinite(lengths.punch) || !Number.isFinite(lengths.die)) return [{ mask: 0, value: 0 }];
    for (const [tool, length] of [[pair.punch, lengths.punch], [pair.die, lengths.die]] as const) {
      const reach = length / 2 - (situation.moves[move]?.halfLength ?? 0) + machine.settings.maxUncoveredEnd;
      const pattern = roomPattern(reach, [{ length, met: clearance.inStroke(hit, pair.punch, pair.die, tool) }], formed);
      if (pattern) return [pattern];
    }
    return null;
  };
  const stops = (pair: ToolPair): readonly BlockedPattern[] | null => {
    const needed = neededReach(situation, move, pair.index);
    if (needed === null) { why.add("fit"); return [{ mask: 0, value: 0 }]; }
    if (Math.min(reach.front, reach.back) < needed) { why.add("minimum-flange"); return [{ mask: level, value: formed & level }]; }
    if (!passesFrames(part, hit, reach.back, machine)) { why.add("throat"); return [{ mask: level, value: formed & level }]; }
    const before = known.get(part) ?? known.get(pair.punch) ?? known.get(pair.die);
    if (before) return before;
    const hits = clearance.firstBlock(hit, pair.punch, pair.die);
    const kind = hits[0]?.kind;
    if (kind === undefined) return noRoom(pair);
    why.add(kind);
    if (kind !== "trapped") known.set(kind === "self" ? part : kind === "ram" ? pair.punch : pair.die, hits);
    return hits;
  };
  for (const pair of pairs) {
    const found = stops(pair);
    if (found === null) return null;
    take(found);
  }
  return { mask, value: formed & mask, why: [...why] };
}

/** Level sheet that the pair needs on both sides; null when it does not fit a bend of the move at all. */
function neededReach({ moves, fits, machine }: Situation, move: number, pair: number): number | null {
  const found = moves[move];
  let [needed, force] = [0, 0];
  for (const bend of found?.bends ?? []) {
    const fit = fits[bend]?.[pair];
    if (!fit?.ok) return null;
    needed = Math.max(needed, fit.reach);
    force = fit.force;
  }
  return (force * (found?.bentLength ?? 0)) / 1000 > machine.maxForce ? null : needed;
}

/** The bends that decide how far the sheet is level beside a hit: those that bound the level faces, and those among them. */
function levelBends(part: PartModel, hit: Hit): number {
  const waiting = hit.bends.flatMap((index) => [part.bends[index]?.parent ?? 0, part.bends[index]?.child ?? 0]);
  const level = new Set(waiting);
  let mask = 0;
  for (let face = waiting.pop(); face !== undefined; face = waiting.pop()) {
    part.bends.forEach(({ parent, child }, index) => {
      if (hit.bends.includes(index) || (parent !== face && child !== face)) return;
      mask |= 1 << index;
      const next = parent === face ? child : parent;
      if (!((hit.formed >> index) & 1) && !level.has(next)) { level.add(next); waiting.push(next); }
    });
  }
  return mask;
}
