import { createCostSoFar } from "../order/createCostSoFar";
import { fullestDeadEnd } from "../order/fullestDeadEnd";
import { bedQuestionOf } from "./bedQuestionOf";
import { constructBeds } from "./constructBeds";
import type { SearchBudget } from "./createBudget";
import { createCandidateKeeper, type Candidate } from "./createCandidateKeeper";
import { createGaugeNumbers } from "./gaugeNumbers";
import type { StepChecks } from "./createStepChecks";
import { planClass } from "./planClass";
import { relaxedProblem } from "./relaxedProblem";
import { kindSets } from "./kindSets";
import { remainingBound } from "../order/remainingBound";
import { searchLearning } from "../order/searchLearning";
import { searchOrder } from "../order/searchOrder";
import { searchBeds } from "./searchBeds";
import { setupSeconds } from "./setupSeconds";
import type { Situation } from "./situation";

export interface VariantAnswer {
  /** Best first. */
  readonly candidates: readonly Candidate[];
  readonly expanded: number;
  /** No plan of this variant with the pairs and beds looked over weighs less. */
  readonly bound: number;
  /** Seconds that no plan goes below, whatever wishes it leaves unmet. */
  readonly floor: number;
  readonly layouts: number;
  readonly pairs: number;
  /** The fullest set of formed bends where every way ends, looked for when it is asked; null when some order works without a bed. */
  readonly deadEnd: (() => number) | null;
  /** True when the budget ended the search. */
  readonly stopped: boolean;
  /** Beds of more stations than were searched cost more than the best plan. */
  readonly anyStations: boolean;
}

/** Beds of up to so many stations are searched; more are only built for an order that works. */
export const MOST_STATIONS = 3;
/** With more bends than this some order is looked for first, so that a search that is stopped has a plan to show. */
const SOME_ORDER_FROM = 12;
/** How much more the rest of an order weighs meanwhile, and how many states are looked at. */
const HASTE = 3;
const HASTY_STATES = 2000;
/** Sets of formed bends looked at for one where every way ends. */
const DEAD_END_SETS = 300;

/** Faces in states of their own that are remembered: about 400 MB. */
const MOST_ANSWERS = 500_000;

/** Best order, fronts, tools and stations for one flat pattern. */
export function solveVariant(situation: Situation, checks: StepChecks, budget: SearchBudget): VariantAnswer {
  const numbers = createGaugeNumbers();
  const keeper = createCandidateKeeper(budget.keep, (candidate) => planClass(situation, candidate));
  /** Every answer of clearance is kept: with too many of them the search ends as if its time were over. */
  const full = () => situation.clearance.counts().entries > MOST_ANSWERS;
  const limits = { shouldStop: () => budget.shouldStop() || full(), onExpand: budget.onExpand };
  const asked = { situation, checks, numbers };
  const relaxed = relaxedProblem(situation, checks, numbers);
  const tally = { layouts: 0, expanded: 0 };
  const floor = floorOf(situation, budget.batch);
  const answer = (bound: number, ends: Partial<VariantAnswer>): VariantAnswer =>
    ({ candidates: keeper.kept(), ...tally, bound, floor, pairs: situation.pairs.length, deadEnd: null, stopped: false, anyStations: false, ...ends });

  const enough = () => budget.firstPlan && keeper.kept().length > 0;
  const known = createCostSoFar(relaxed, budget.shouldStop);
  if (situation.part.bends.length > SOME_ORDER_FROM) {
    budget.doing("Looking for a first order", 0);
    const some = searchOrder(relaxed, { ...limits, soFar: known, haste: HASTE, most: HASTY_STATES });
    tally.expanded += some.expanded;
    if (some.kind === "found") constructBeds(bedQuestionOf(asked, relaxed, budget, keeper, { steps: some.steps, least: 0, soFar: known }), some.steps, () => keeper.kept().length > 0);
    if (enough()) return answer(floor, { stopped: true });
  }
  budget.doing("Looking for the best order with the bed left out", tally.expanded);
  const { outcome: best, soFar, stale } = searchLearning(relaxed, { ...limits, soFar: known });
  tally.expanded += best.expanded;
  if (best.kind === "stopped") return answer(Math.max(floor, setupSeconds(situation.machine, 1) + best.bound * budget.batch), { stopped: true });
  if (best.kind === "none") return answer(Infinity, { candidates: [], deadEnd: () => fullestDeadEnd(relaxed, DEAD_END_SETS, budget.shouldStop) });

  const first = bedQuestionOf(asked, relaxed, budget, keeper, { steps: best.steps, least: best.weight, soFar });
  const least = Math.min(...kindSets(first, 1).map((set) => set.floor), setupSeconds(situation.machine, 2) + best.weight * budget.batch);
  const done = () => keeper.worst() <= least || enough();
  constructBeds(first, best.steps, done);
  if (enough()) return answer(least, { stopped: true });
  const question = keeper.worst() <= least || !stale ? first : { ...first, limits: { ...first.limits, soFar: createCostSoFar(relaxed, budget.shouldStop) } };
  /** With so many stations, and with more, no plan weighs less. */
  const from = (count: number) => setupSeconds(situation.machine, count) + question.least * budget.batch;
  const most = Math.min(MOST_STATIONS, situation.part.bends.length);
  let open = Infinity;
  for (let count = 1; count <= most && open === Infinity; count += 1) {
    const searched = searchBeds(question, count);
    tally.layouts += searched.layouts;
    tally.expanded += searched.expanded;
    open = count < most && searched.open < Infinity ? Math.min(searched.open, from(count + 1)) : searched.open;
  }
  const cheapest = keeper.kept()[0];
  const weight = cheapest?.weight ?? Infinity;
  const anyStations = from(MOST_STATIONS + 1) >= weight;
  const beyond = (cheapest?.layout.stations.length ?? 0) > MOST_STATIONS ? from(MOST_STATIONS + 1) : Infinity;
  return answer(Math.min(open, beyond, weight), { stopped: open < Infinity, anyStations });
}

/** What the cheapest bed and the fewest strokes, flips and turns cost: no plan is under it. */
function floorOf({ part, moves, machine }: Situation, batch: number): number {
  const problem = { bends: part.bends.length, moves, stations: 1, times: machine.times, walk: () => 0, option: () => null };
  const all = 2 ** part.bends.length - 1;
  return setupSeconds(machine, 1) + batch * (machine.times.gaugeMove + remainingBound(problem)(all, null));
}
