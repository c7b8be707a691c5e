import type { OrderStep } from "../order/orderProblem";
import { remainingBound } from "../order/remainingBound";
import { searchOrder } from "../order/searchOrder";
import { combineStations } from "../setup/combineStations";
import type { Layout } from "../setup/layout";
import { placeStations } from "../setup/placeStations";
import { createGaugeNumbers } from "./gaugeNumbers";
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
  const relaxed = searchOrder(relaxedProblem(situation, checks, numbers), limits);
  expanded += relaxed.expanded;
  const none = { candidates: [], layouts: 0, pairs: situation.pairs.length, deadEnds: null };
  if (relaxed.kind === "stopped") return { ...none, expanded, bound: relaxed.bound * budget.batch, stopped: true };
  if (relaxed.kind === "none") return { ...none, expanded, bound: Infinity, stopped: false, deadEnds: relaxed.deadEnds };
  const favoured = favouredPairs(situation, checks, relaxed.steps);
  const least = relaxed.weight * budget.batch;
  const candidates: Candidate[] = [];
  const worst = () => Math.min(under, candidates.length < budget.keep ? Infinity : candidates[budget.keep - 1]?.weight ?? Infinity);
  const keep = (candidate: Candidate) => {
    candidates.push(candidate);
    candidates.sort((a, b) => a.weight - b.weight);
    candidates.length = Math.min(candidates.length, budget.keep);
  };
  let layouts = 0;
  let open = Infinity;
  const { times } = situation.machine;
  for (const count of [1, 2, 3] as const) {
    const cheapest = count * (times.stationSetup + 2 * times.sectionPlace);
    if (open < Infinity || count > situation.part.bends.length || cheapest + least >= worst() - SAME_SECONDS) break;
    for (const layout of layoutsByCost(situation, count, favoured)) {
      if (layout.setupSeconds + least >= worst() - SAME_SECONDS) break;
      const outcome = searchOrder(layoutProblem(situation, checks, numbers, layout), { ...limits, under: (worst() - layout.setupSeconds) / budget.batch });
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

/** What the cheapest bed and the fewest strokes, flips and turns cost: no plan is under it. */
function floorOf(situation: Situation, batch: number): number {
  const { times } = situation.machine;
  const all = 2 ** situation.part.bends.length - 1;
  const bends = relaxedBound(situation, all);
  return times.stationSetup + 2 * times.sectionPlace + batch * bends;
}

function relaxedBound({ part, moves, machine: { times } }: Situation, all: number): number {
  const problem = { bends: part.bends.length, moves, stations: 1, times, walk: () => 0, option: () => null };
  return times.gaugeMove + remainingBound(problem)(all, null);
}

/** The pairs that the unhindered order uses: those that a bed of several stations needs most likely. */
function favouredPairs(situation: Situation, checks: StepChecks, steps: readonly OrderStep[]): ReadonlySet<number> {
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
