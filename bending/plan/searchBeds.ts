import TinyQueue from "tinyqueue";
import type { OrderStep } from "../order/orderProblem";
import { searchLearning } from "../order/searchLearning";
import { searchOrder } from "../order/searchOrder";
import type { Layout, Station } from "../setup/layout";
import { createStationMaker } from "../setup/createStationMaker";
import { aloneProblem } from "./aloneProblem";
import type { BedQuestion } from "./bedQuestion";
import { bedsOf } from "./bedsOf";
import { kindSets, spareSets, splitSet, type KindSet } from "./kindSets";
import { layoutProblem } from "./layoutProblem";

export interface BedsAnswer {
  readonly layouts: number;
  readonly expanded: number;
  /** No bed of so many stations that was not searched to its end weighs less; Infinity when none is left. */
  readonly open: number;
}

/** A set of beds, with the best order that it has when no station is in another's way once that is known. */
interface Promising extends KindSet {
  /** No bed of the set weighs less. */
  readonly bound: number;
  readonly best: { readonly perPart: number; readonly steps: readonly OrderStep[] } | null;
}

/** A set is searched on by this part of its weight at the least, before another set has its turn. */
const STEP = 0.01;

/**
 * Every bed of so many stations that may be better than what is kept, those that promise most first. A set of beds is
 * queued at its floor, searched on while no other promises more, queued at the weight of its best order with each station
 * alone, then split; what is one bed only is set up.
 */
export function searchBeds(question: BedQuestion, count: number): BedsAnswer {
  const { situation, keeper, budget, limits } = question;
  const tally = { layouts: 0, expanded: 0 };
  const queue = new TinyQueue<Promising>(kindSets(question, count).map(unsearched(0)), (a, b) => a.bound - b.bound);
  const seen = new Set<string>();
  const make = createStationMaker((pair) => must(situation.pairs[pair]), situation.machine.settings);
  for (let one = queue.pop(); one !== undefined && one.bound < keeper.worst(); one = queue.pop()) {
    if (one.best === null) {
      budget.doing("Looking which stations go together", tally.expanded);
      const wanted = Math.max(queue.peek()?.bound ?? Infinity, one.bound + STEP * (one.bound - one.setup));
      const most = Math.min(wanted, keeper.worst());
      const { outcome } = searchLearning(aloneProblem(question, one.groups), { ...limits, under: (most - one.setup) / budget.batch });
      tally.expanded += outcome.expanded;
      if (outcome.kind === "stopped") return { ...tally, open: one.bound };
      if (outcome.kind === "found") queue.push({ ...one, bound: Math.max(one.bound, one.setup + outcome.weight * budget.batch), best: { perPart: outcome.weight, steps: outcome.steps } });
      else if (outcome.over < Infinity) queue.push({ ...one, bound: Math.max(one.bound, one.setup + outcome.over * budget.batch) });
      continue;
    }
    if (one.groups.some(({ families }) => families.length > 1)) {
      splitSet(question, one).map(unsearched(one.bound)).forEach((set) => queue.push(set));
      continue;
    }
    const stations = make(one.groups.map(({ families: [family] }) => must(family).best));
    if (stations === null || piecesOf(stations) > one.pieces) spareSets(question, one, seen).map(unsearched(0)).forEach((set) => queue.push(set));
    for (const layout of stations === null ? [] : bedsOf(question, stations, one.best.steps)) {
      if (!searchBed(question, layout, one.best.perPart, tally)) return { ...tally, open: one.bound };
    }
  }
  return { ...tally, open: Infinity };
}

const unsearched = (bound: number) => (set: KindSet): Promising => ({ ...set, bound: Math.max(bound, set.floor), best: null });

/** The best order on a bed, kept when it is worth it; false when told to stop. */
function searchBed({ situation, checks, numbers, keeper, budget, limits, relaxed }: BedQuestion, layout: Layout, perPart: number, tally: { layouts: number; expanded: number }): boolean {
  if (layout.setupSeconds + perPart * budget.batch >= keeper.worst()) return true;
  budget.doing("Looking for the order on one bed after another", tally.expanded);
  const problem = { ...layoutProblem(situation, checks, numbers, layout), least: relaxed.least };
  const outcome = searchOrder(problem, { ...limits, under: (keeper.worst() - layout.setupSeconds) / budget.batch });
  tally.layouts += 1;
  tally.expanded += outcome.expanded;
  if (outcome.kind === "found") keeper.keep({ layout, steps: outcome.steps, perPart: outcome.seconds, demerits: outcome.demerits, weight: layout.setupSeconds + outcome.weight * budget.batch });
  return outcome.kind !== "stopped";
}

const piecesOf = (stations: readonly Station[]) => stations.reduce((sum, { punch, die }) => sum + punch.pieces.length + die.pieces.length, 0);

function must<T>(value: T | undefined): T {
  if (value === undefined) throw new Error("invariant: a pair of the situation, a family of a group");
  return value;
}
