import type { OrderStep } from "../order/orderProblem";
import { unhindered } from "./unhindered";
import { remainingBound } from "../order/remainingBound";
import { searchOrder } from "../order/searchOrder";
import { combineStations } from "../setup/combineStations";
import type { Layout } from "../setup/layout";
import { placeStations } from "../setup/placeStations";
import { diveOrder } from "../order/diveOrder";
import { createGaugeNumbers, type GaugeNumbers } from "./gaugeNumbers";
import type { StepChecks } from "./createStepChecks";
import { layoutProblem } from "./layoutProblem";
import { layoutWishes } from "./layoutWishes";
import { relaxedProblem } from "./relaxedProblem";
import type { SearchBudget } from "./searchBudget";
import type { Situation } from "./situation";

export interface Candidate {
  readonly layout: Layout;
  readonly steps: readonly OrderStep[];
  readonly perPart: number;
  readonly demerits: number;
  /** Setup and batch in seconds, demerits weighed in. */
  readonly weight: number;
}

export interface VariantAnswer {
  /** Best first. */
  readonly candidates: readonly Candidate[];
  readonly expanded: number;
  /** No plan of this variant weighs less. */
  readonly bound: number;
  readonly layouts: number;
  readonly pairs: number;
  /** The sets of formed bends where every way ends, when no order can work whatever the bed. */
  readonly deadEnds: readonly number[] | null;
  /** True when the budget ended the search. */
  readonly stopped: boolean;
}

/** Two weights nearer than this are equal. */
const SAME_SECONDS = 1e-7;

/** Best order, fronts, tools and stations for one flat pattern; `under` is a weight already reached elsewhere. */
export function solveVariant(situation: Situation, checks: StepChecks, budget: SearchBudget, under: number): VariantAnswer {
  const floor = floorOf(situation, budget.batch);
  if (floor >= under - SAME_SECONDS) return { candidates: [], expanded: 0, bound: floor, layouts: 0, pairs: situation.pairs.length, deadEnds: null, stopped: false };
  const numbers = createGaugeNumbers();
  let expanded = 0;
  const limits = {
    shouldStop: budget.shouldStop,
    onExpand: (count: number) => budget.onProgress({ expanded: expanded + count, fraction: null, message: "Looking for the order" }),
  };
  const first = divedFirst(situation, checks, numbers, budget);
  const none = { candidates: first ? [first] : [], layouts: 0, pairs: situation.pairs.length, deadEnds: null };
  const relaxed = unhindered(relaxedProblem(situation, checks, numbers), limits);
  expanded += relaxed.expanded;
  if (relaxed.kind === "stopped") return { ...none, expanded, bound: Math.max(floor, relaxed.bound * budget.batch + cheapestBed(situation, 1)), stopped: true };
  if (relaxed.kind === "none") return { ...none, candidates: [], expanded, bound: Infinity, stopped: false, deadEnds: relaxed.deadEnds };
  const favoured = favouredPairs(situation, checks, relaxed.steps);
  const least = relaxed.weight * budget.batch;
  const candidates: Candidate[] = first ? [first] : [];
  const worst = () => Math.min(under, candidates.length < budget.keep ? Infinity : candidates[budget.keep - 1]?.weight ?? Infinity);
  const keep = (candidate: Candidate) => {
    candidates.push(candidate);
    candidates.sort((a, b) => a.weight - b.weight);
    candidates.length = Math.min(candidates.length, budget.keep);
  };
  let layouts = 0;
  let open = Infinity;
  for (const count of [1, 2, 3] as const) {
    const cheapest = cheapestBed(situation, count);
    if (open < Infinity || count > situation.part.bends.length || cheapest + least >= worst() - SAME_SECONDS) break;
    for (const layout of layoutsByCost(situation, count, favoured)) {
      if (layout.setupSeconds + least >= worst() - SAME_SECONDS) break;
      const outcome = searchOrder(layoutProblem(situation, checks, numbers, layout), { ...limits, ...relaxed.better, under: (worst() - layout.setupSeconds) / budget.batch });
      layouts += 1;
      expanded += outcome.expanded;
      if (outcome.kind === "stopped" || budget.shouldStop()) open = cheapest + least;
      if (outcome.kind === "found") keep({ layout, steps: outcome.steps, perPart: outcome.seconds, demerits: outcome.demerits, weight: layout.setupSeconds + outcome.weight * budget.batch });
      if (open < Infinity) break;
    }
  }
  const bound = Math.min(open, candidates[0]?.weight ?? Infinity);
  return { candidates, expanded, bound, layouts, pairs: situation.pairs.length, deadEnds: null, stopped: open < Infinity };
}

/** Beds of one station that are dived into for a first plan, and how far. */
const DIVES = 4;
const DIVE_STATES = 200;

/** Some plan, early, so that a search that is ended has something to show. */
function divedFirst(situation: Situation, checks: StepChecks, numbers: GaugeNumbers, budget: SearchBudget): Candidate | null {
  for (const layout of layoutsByCost(situation, 1, new Set()).slice(0, DIVES)) {
    const dived = diveOrder(layoutProblem(situation, checks, numbers, layout), DIVE_STATES, budget.shouldStop);
    if (dived) return { layout, steps: dived.steps, perPart: dived.seconds, demerits: dived.demerits, weight: layout.setupSeconds + dived.weight * budget.batch };
  }
  return null;
}

/** What the cheapest bed and the fewest strokes, flips and turns cost: no plan is under it. */
function cheapestBed({ machine: { times } }: Situation, count: number): number {
  return count * (times.stationSetup + 2 * times.sectionPlace);
}

function floorOf(situation: Situation, batch: number): number {
  const all = 2 ** situation.part.bends.length - 1;
  const bends = relaxedBound(situation, all);
  return cheapestBed(situation, 1) + batch * bends;
}

function relaxedBound({ part, moves, machine: { times } }: Situation, all: number): number {
  const problem = { bends: part.bends.length, moves, stations: 1, times, walk: () => 0, option: () => null };
  return times.gaugeMove + remainingBound(problem)(all, null);
}

/** The pairs that the unhindered order uses: those that a bed of several stations needs most likely. */
function favouredPairs(situation: Situation, checks: StepChecks, steps: readonly { readonly move: number; readonly formed: number }[]): ReadonlySet<number> {
  return new Set(steps.flatMap(({ move, formed }) => {
    const pair = situation.pairs.find(({ index }) => checks.possible(move, formed, index));
    return pair === undefined ? [] : [pair.index];
  }));
}

/** Layouts of so many stations: least setup time first, then the V wanted most, then the shorter tools. */
function layoutsByCost(situation: Situation, count: 1 | 2 | 3, favoured: ReadonlySet<number>): readonly Layout[] {
  const { pairs, machine } = situation;
  const overhang = partOverhang(situation);
  const rank = (layout: Layout) => layout.stations.reduce((sum, { pair }) => sum + pairs.findIndex(({ die }) => die.vOpening === pairs[pair]?.die.vOpening), 0);
  const length = (layout: Layout) => layout.stations.reduce((sum, { punch, die }) => sum + punch.length + die.length, 0);
  return layoutWishes(situation, count, favoured)
    .flatMap((wishes) => combineStations(wishes, machine.settings))
    .flatMap((stations) => placeStations(stations, overhang, machine))
    .map((layout) => ({ layout, rank: rank(layout), length: length(layout) }))
    .sort((a, b) => a.layout.setupSeconds - b.layout.setupSeconds || a.rank - b.rank || a.length - b.length)
    .map(({ layout }) => layout);
}

/** How far the sheet sticks out beyond a bend line at the most: a station this far off is never in the way. */
function partOverhang({ part, moves, machine }: Situation): number {
  const corners = part.faces.flatMap(({ outline }) => outline);
  const size = Math.hypot(span(corners.map((p) => p[0])), span(corners.map((p) => p[1])));
  return size - Math.min(...moves.map(({ halfLength }) => halfLength)) + machine.settings.clearance;
}

const span = (values: readonly number[]) => Math.max(...values) - Math.min(...values);
