import type { Hit } from "../clearance/hit";
import type { BlockedPattern } from "../order/createFacts";
import type { PartModel } from "../part/partModel";
import type { StepChecks } from "./createStepChecks";
import { passesFrames } from "./passesFrames";
import { sheetReach } from "./sheetReach";
import type { Situation } from "./situation";
import type { ToolPair } from "./toolPair";

export interface Blocked extends BlockedPattern {
  /** What stands in the way with one pair or another. */
  readonly why: readonly string[];
}

/**
 * Every state in which no pair can make a move for the same reasons as in this one; null when some pair can, or when one
 * fails for want of room along the bed, which depends on all bends.
 */
export function blockedPattern(situation: Situation, checks: StepChecks, move: number, formed: number): Blocked | null {
  const { part, machine, pairs, clearance } = situation;
  const hit = checks.hitOf(move, formed);
  const reach = sheetReach(part, hit);
  const level = levelBends(part, hit);
  const why = new Set<string>();
  const known = new Map<object, readonly BlockedPattern[]>();
  let mask = 0;
  const take = (patterns: readonly BlockedPattern[]) => {
    const added = patterns.map((pattern) => pattern.mask).sort((a, b) => bits(a & ~mask) - bits(b & ~mask));
    mask |= added[0] ?? 0;
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
    if (kind === undefined) return null;
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

function bits(set: number): number {
  let count = 0;
  for (let rest = set; rest !== 0; rest &= rest - 1) count += 1;
  return count;
}
