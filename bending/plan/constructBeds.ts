import { followOrder } from "../order/followOrder";
import type { OrderStep } from "../order/orderProblem";
import { createStationMaker } from "../setup/createStationMaker";
import { stationKinds, type StationKind } from "../setup/stationKinds";
import type { BedQuestion } from "./bedQuestion";
import { bedsOf } from "./bedsOf";
import { layoutProblem } from "./layoutProblem";
import type { ToolPair } from "./toolPair";

/** One stroke of an order that works with the bed left out. */
export interface WantedStep { readonly move: number; readonly formed: number }

/** Pairs that stations are made of when those of the order itself do not do: the likeliest. */
const PAIRS_TRIED = 12;

/**
 * Some plan at once: the order that works without a bed, and as few kinds of station as cover its steps (each time the
 * one that covers most of what is left), set on the bed; first of the pairs that the order was found with, and of more when
 * that is not `enough`. Nothing is proven by it.
 */
export function constructBeds(question: BedQuestion, steps: readonly WantedStep[], enough: () => boolean): void {
  const { pairs } = question.situation;
  construct(question, steps, pairs.filter(({ index }) => question.favoured.has(index)));
  if (!enough()) construct(question, steps, pairs.slice(0, PAIRS_TRIED));
}

function construct(question: BedQuestion, steps: readonly WantedStep[], pairs: readonly ToolPair[]): void {
  const { situation, checks, numbers, keeper, budget } = question;
  const make = createStationMaker((pair) => {
    const found = situation.pairs[pair];
    if (found === undefined) throw new Error("invariant: a pair of the situation");
    return found;
  }, situation.machine.settings);
  for (const { kinds, wanted } of covers(question, steps, pairs)) {
    const stations = make(kinds);
    for (const layout of stations === null ? [] : bedsOf(question, stations, wanted)) {
      if (budget.shouldStop() && keeper.kept().length > 0) return;
      const made = followOrder(layoutProblem(situation, checks, numbers, layout), steps.map(({ move }) => move));
      if (made) keeper.keep({ layout, steps: made.steps, perPart: made.seconds, demerits: made.demerits, weight: layout.setupSeconds + made.weight * budget.batch });
    }
  }
}

interface Cover { readonly kinds: readonly StationKind[]; readonly wanted: readonly OrderStep[] }

/** For every shut height that tools have together, the kinds that cover all steps; fewest first. */
function covers({ situation, alone, budget }: BedQuestion, steps: readonly WantedStep[], tried: readonly ToolPair[]): readonly Cover[] {
  const { moves, runs } = situation;
  const lengths = [...new Set(steps.map(({ move }) => (moves[move]?.halfLength ?? 0) * 2))];
  const byHeight = new Map<string, StationKind[]>();
  for (const { index, punch, die } of tried) {
    if (budget.shouldStop()) break;
    const key = (punch.height + die.height).toFixed(1);
    const kinds = stationKinds(lengths.map((lineLength) => ({ pair: index, punch, die, lineLength })), runs);
    byHeight.set(key, [...(byHeight.get(key) ?? []), ...kinds]);
  }
  const holds = (kind: StationKind, { move, formed }: WantedStep) => alone.can(kind, move, formed);
  return [...byHeight.values()].flatMap((kinds) => cover(kinds, steps, holds) ?? []).sort((a, b) => a.kinds.length - b.kinds.length);
}

function cover(kinds: readonly StationKind[], steps: readonly WantedStep[], holds: (kind: StationKind, step: WantedStep) => boolean): Cover | null {
  const chosen: StationKind[] = [];
  const station = new Map<WantedStep, number>();
  while (station.size < steps.length) {
    const left = steps.filter((step) => !station.has(step));
    const counted = kinds.map((kind) => ({ kind, covered: left.filter((step) => holds(kind, step)) }));
    const best = counted.reduce<(typeof counted)[number] | null>((a, b) => (a === null || better(b, a) ? b : a), null);
    if (best === null || best.covered.length === 0) return null;
    for (const step of best.covered) station.set(step, chosen.length);
    chosen.push(best.kind);
  }
  return { kinds: chosen, wanted: steps.map((step) => ({ ...step, station: station.get(step) ?? 0 })) };
}

interface Counted { readonly kind: StationKind; readonly covered: readonly WantedStep[] }

/** Covers more steps; as many with fewer pieces; as few with less to carry. */
function better(a: Counted, b: Counted): boolean {
  const order = b.covered.length - a.covered.length || a.kind.pieces - b.kind.pieces || a.kind.punchLength + a.kind.dieLength - b.kind.punchLength - b.kind.dieLength;
  return order < 0;
}
