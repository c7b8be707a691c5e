import type { PlanRequest } from "@/bending/plan/planRequest";
import { everyBed } from "./everyBed";
import { everyOrderOn } from "./everyOrderOn";
import { everyQuestion } from "./everyQuestion";
import { placedOn, type Bed } from "./placedOn";

export interface ExhaustiveAnswer {
  readonly demerits: number;
  /** Setup and batch, demerits left out. */
  readonly seconds: number;
  readonly stations: number;
  readonly order: readonly string[];
  readonly beds: number;
  readonly asked: number;
}

/** Outweighs any number of seconds: unmet wishes go first. */
export const DEMERIT = 1e6;

/**
 * The best plan by trying everything: every pair of tools on every station, every way to make runs of the pieces in stock, stations in every order from
 * left to right with each of the gaps between them, every order of strokes with every front at every station. Beds are taken cheapest first, and
 * the trying ends where the setup alone, with the best order that the part has with a bed of its own for every stroke, costs more than what was found.
 */
export function exhaustivePlan(request: PlanRequest, most: number, gaps: readonly number[]): ExhaustiveAnswer | null {
  const questions = everyQuestion(request);
  const { situation } = questions;
  const { machine, batch } = request;
  const free = everyOrderOn(questions, { stations: situation.pairs.map(({ index }) => ({ pair: index, z: 0 })), walks: false }, (move, formed, { pair }) => questions.ask(move, formed, pair));
  if (free === null) return null;
  let best: ExhaustiveAnswer & { readonly weight: number } | null = null;
  let beds = 0;
  for (let count = 1; count <= most; count += 1) {
    for (const { runs, pieces } of everyBed(situation, count)) {
      const setup = count * machine.times.stationSetup + pieces * machine.times.sectionPlace;
      const least = setup + batch * free.weight;
      if (best !== null && least >= best.weight - 1e-6) break;
      // Stations as near as they may stand, none in another's way: no place of theirs is better.
      const alone: Bed = { walks: true, stations: runs.map((run, i) => ({ ...run, z: i === 0 ? 0 : (Math.max(...[runs[0], run].map((one) => 0.5 * Math.max(one!.punch, one!.die))) + (gaps[0] ?? 0)) })) };
      const apart = everyOrderOn(questions, count < 3 ? alone : { ...alone, walks: false }, (move, formed, station) => placedOn(questions, { walks: false, stations: [station] }, 0, move, formed));
      if (apart === null || (best !== null && setup + batch * apart.weight >= best.weight - 1e-6)) continue;
      for (const bed of standings(runs, count < 2 ? [0] : gaps, machine.bedLength)) {
        beds += 1;
        const order = everyOrderOn(questions, bed, (move, formed, _, index) => placedOn(questions, bed, index, move, formed));
        if (order === null) continue;
        const weight = setup + batch * order.weight;
        if (best !== null && weight >= best.weight - 1e-6) continue;
        best = { weight, demerits: order.demerits, seconds: setup + batch * (order.weight - order.demerits * DEMERIT), stations: count, order: order.order, beds: 0, asked: 0 };
      }
    }
  }
  return best === null ? null : { ...(best as ExhaustiveAnswer), beds, asked: questions.asked() };
}

type Runs = ReturnType<typeof everyBed>[number]["runs"];

/** Runs side by side in every order with the same gap between any two, about the middle of the bed. */
function standings(runs: Runs, gaps: readonly number[], bedLength: number): readonly Bed[] {
  const length = (index: number) => Math.max(runs[index]?.punch ?? 0, runs[index]?.die ?? 0);
  return gaps.flatMap((gap) => permutations(runs.map((_, i) => i)).flatMap((along): Bed[] => {
    const total = along.reduce((sum, index) => sum + length(index), gap * (runs.length - 1));
    if (total > bedLength) return [];
    let at = -total / 2;
    const z = new Map<number, number>();
    for (const index of along) {
      z.set(index, at + length(index) / 2);
      at += length(index) + gap;
    }
    return [{ walks: true, stations: runs.map((run, i) => ({ ...run, z: z.get(i) ?? 0 })) }];
  }));
}

function permutations(items: readonly number[]): readonly (readonly number[])[] {
  if (items.length < 2) return [items];
  return items.flatMap((first) => permutations(items.filter((one) => one !== first)).map((rest) => [first, ...rest]));
}
