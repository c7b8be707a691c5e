import type { OrderStep } from "../order/orderProblem";
import { searchOrder } from "../order/searchOrder";
import type { Layout } from "../setup/layout";
import { createStationMaker } from "../setup/createStationMaker";
import { aloneProblem } from "./aloneProblem";
import type { BedQuestion } from "./bedQuestion";
import { bedsOf } from "./bedsOf";
import { classSets } from "./classSets";
import { kindClasses, type KindClass, type KindClasses } from "./kindClasses";
import { kindsFor } from "./kindsFor";
import { layoutProblem } from "./layoutProblem";
import { setupSeconds } from "./setupSeconds";
import { stationSets } from "./stationSets";

export interface BedsAnswer {
  readonly layouts: number;
  readonly expanded: number;
  /** No bed of so many stations that was not searched to its end weighs less; Infinity when none is left. */
  readonly open: number;
}

/** A set of classes with the best order that it has when no station is in another's way. */
interface Promising {
  readonly classes: readonly KindClass[];
  readonly perPart: number;
  readonly bound: number;
  readonly steps: readonly OrderStep[];
}

/** So few kinds are looked at one by one, without sorting them into classes. */
const FEW_KINDS = 6;

/** Every bed of so many stations that may be better than what is kept, those that promise most first. */
export function searchBeds(question: BedQuestion, count: number): BedsAnswer {
  const { situation, keeper, least, budget } = question;
  const floor = setupSeconds(situation.machine, count) + least * budget.batch;
  const tally = { layouts: 0, expanded: 0 };
  if (floor >= keeper.worst()) return { ...tally, open: Infinity };
  const found = classesFor(question, count);
  const sets = found === null ? null : classSets(question, found, count);
  const promising = sets === null ? null : promisingSets(question, sets, tally);
  if (promising === null) return { ...tally, open: floor };
  const make = createStationMaker((pair) => must(situation.pairs[pair]), situation.machine.settings);
  for (const one of promising) {
    if (one.bound >= keeper.worst()) break;
    const most = (keeper.worst() - one.perPart * budget.batch - setupSeconds(situation.machine, count, 0)) / situation.machine.times.sectionPlace;
    for (const { kinds, pieces } of stationSets(one.classes, most)) {
      if (setupSeconds(situation.machine, count, pieces) + one.perPart * budget.batch >= keeper.worst()) break;
      const stations = make(kinds);
      for (const layout of stations === null ? [] : bedsOf(question, stations, one.steps)) {
        if (!searchBed(question, layout, one.perPart, tally)) return { ...tally, open: one.bound };
      }
    }
  }
  return { ...tally, open: Infinity };
}

/** The best order on a bed, kept when it is worth it; false when told to stop. */
function searchBed({ situation, checks, numbers, keeper, budget, limits }: BedQuestion, layout: Layout, perPart: number, tally: { layouts: number; expanded: number }): boolean {
  if (layout.setupSeconds + perPart * budget.batch >= keeper.worst()) return true;
  budget.doing("Looking for the order on one bed after another", tally.expanded);
  const outcome = searchOrder(layoutProblem(situation, checks, numbers, layout), { ...limits, under: (keeper.worst() - layout.setupSeconds) / budget.batch });
  tally.layouts += 1;
  tally.expanded += outcome.expanded;
  if (outcome.kind === "found") keeper.keep({ layout, steps: outcome.steps, perPart: outcome.seconds, demerits: outcome.demerits, weight: layout.setupSeconds + outcome.weight * budget.batch });
  return outcome.kind !== "stopped";
}

function classesFor(question: BedQuestion, count: number): KindClasses | null {
  const { situation, keeper, least, budget, alone, sets } = question;
  const worth = kindsFor(situation, count, question.favoured)
    .filter(({ pieces }) => setupSeconds(situation.machine, count, pieces + 2 * (count - 1)) + least * budget.batch < keeper.worst());
  if (sets !== null && worth.length > FEW_KINDS) return kindClasses(situation, alone, worth, sets, budget.shouldStop);
  const words = Math.ceil(situation.moves.length / 32);
  const anything = new Int32Array(words * (sets?.length ?? 0)).fill(-1);
  return { classes: worth.map((kind) => ({ pair: kind.pair, kinds: [kind], shortest: kind.length, can: anything })), words };
}

function promisingSets(question: BedQuestion, sets: NonNullable<ReturnType<typeof classSets>>, tally: { expanded: number }): readonly Promising[] | null {
  const { situation: { machine }, keeper, budget, limits } = question;
  const found: Promising[] = [];
  for (const { classes } of sets) {
    const setup = setupSeconds(machine, classes.length, classes.reduce((sum, { kinds }) => sum + (kinds[0]?.pieces ?? 0), 0));
    budget.doing("Looking which stations go together", tally.expanded);
    const outcome = searchOrder(aloneProblem(question, classes), { ...limits, under: (keeper.worst() - setup) / budget.batch });
    tally.expanded += outcome.expanded;
    if (outcome.kind === "stopped") return null;
    if (outcome.kind === "found") found.push({ classes, perPart: outcome.weight, bound: setup + outcome.weight * budget.batch, steps: outcome.steps });
  }
  return found.sort((a, b) => a.bound - b.bound);
}

function must<T>(value: T | undefined): T {
  if (value === undefined) throw new Error("invariant: a pair of the situation");
  return value;
}
