import { createHitPlaces } from "../clearance/createHitPlaces";
import type { Hit } from "../clearance/hit";
import type { Interval } from "../geometry/interval";
import { createGaugeOptions } from "../setup/createGaugeOptions";
import type { GaugeOption } from "../setup/gaugeOption";
import type { Tool } from "../tooling/tool";
import { createKeeping } from "../gauging/createKeeping";
import { fingerHeight } from "../setup/fingerHeight";
import { bendsBehind } from "./bendsBehind";
import { createMoveFacts, type MoveFacts } from "./createMoveFacts";
import { createStateTable, type StateTable } from "./createStateTable";
import { fingerCount } from "./fingerCount";
import type { Situation } from "./situation";
import type { ToolPair } from "./toolPair";

/** The yes-or-no questions of a search, each answered once. */
export interface StepChecks {
  readonly hitOf: (move: number, formed: number) => Hit;
  /** Can the pair form these bends now, given room on the bed? */
  readonly possible: (move: number, formed: number, pair: number) => boolean;
  /** Where the tool must not stand while the move is made, z from the line's middle. */
  readonly forbidden: (move: number, formed: number, pair: number, obstacle: Tool) => readonly Interval[];
  /** Ways to gauge the sheet that clear the tools of the pair, best first. */
  readonly gauges: (move: number, formed: number, pair: number) => readonly GaugeOption[];
  /** How many lengths that the document asks for are not held when the move is gauged so. */
  readonly unkept: (move: number, formed: number, option: GaugeOption | undefined) => number;
  /** Do all pairs that fit gauge this move alike? */
  readonly gaugesAgree: (move: number, formed: number) => boolean;
  /** Unmet wishes of the pair for the move. */
  readonly wishes: (move: number, pair: number) => number;
}

export function createStepChecks(situation: Situation): StepChecks {
  const { part, machine, moves, pairs, clearance, fingers } = situation;
  const facts = moves.map((_, move) => createMoveFacts(situation, move));
  const factsOf = (move: number): MoveFacts => must(facts[move]);
  const pairOf = (pair: number): ToolPair => must(pairs[pair]);
  const hitOf = (move: number, formed: number): Hit => {
    const { bends, front } = must(moves[move]);
    return { bends, front, formed };
  };
  const table = <T>() => createStateTable<T>(part.bends.length, moves.length);

  const possibles = pairs.map(() => table<boolean>());
  const possible = (move: number, formed: number, pair: number): boolean => {
    const known = must(possibles[pair]);
    const answer = known.get(move, formed);
    if (answer !== undefined) return answer;
    const needed = factsOf(move).needed[pair];
    const { punch, die } = pairOf(pair);
    const found = needed !== null && needed !== undefined && factsOf(move).lies(formed, needed) && clearance.firstBlock(hitOf(move, formed), punch, die).length === 0;
    known.set(move, formed, found);
    return found;
  };

  const intervals = pairs.map(() => new Map<Tool, StateTable<readonly Interval[]>>());
  const placeOf = createHitPlaces(part, machine.settings.clearance, { clips: 0, entries: 0 });
  const gaugeOptions = createGaugeOptions(part, machine.gauge);
  const meets = (option: GaugeOption, { punch, die }: ToolPair): boolean => [option.free[0]?.[0] ?? 0, option.free[option.free.length - 1]?.[1] ?? 0]
    .some((z) => fingers.pair(option.x + option.slope * z, option.r, part.thickness, punch, die));
  const { gaugeRepeat, angleRepeat } = machine.settings;
  const keeping = createKeeping(part, { gauge: gaugeRepeat, angle: angleRepeat }, fingerHeight(machine.gauge), (option) => fingerCount(option, machine.gauge));
  const behind = moves.map((move) => bendsBehind(situation, { bends: move.bends, front: move.front, formed: 0 }));
  /** For each list of ways to gauge, those that clear one pair's tools. */
  const clearing = new Map<readonly GaugeOption[], (readonly GaugeOption[] | undefined)[]>();
  const gauges = (move: number, formed: number, pair: number): readonly GaugeOption[] => {
    const all = gaugeOptions(placeOf(must(moves[move])), formed);
    const known = clearing.get(all) ?? [];
    clearing.set(all, known);
    return (known[pair] ??= preferred(move, formed, all.filter((option) => !meets(option, pairOf(pair)))));
  };
  const preferred = (move: number, formed: number, clear: readonly GaugeOption[]): readonly GaugeOption[] =>
    keeping === null ? clear : keeping.preferred(hitOf(move, formed & (behind[move] ?? 0)), clear);
  return {
    hitOf,
    possible,
    gauges,
    unkept: (move, formed, option) => (keeping === null || option === undefined ? 0 : keeping.unkept(hitOf(move, formed), option)),
    gaugesAgree: (move, formed) => {
      const { fitting } = factsOf(move);
      const first = fitting.map((pair) => gauges(move, formed, pair)[0]);
      return first.every((option) => option === first[0]);
    },
    forbidden: (move, formed, pair, obstacle) => {
      const ofPair = must(intervals[pair]);
      const known = ofPair.get(obstacle) ?? table<readonly Interval[]>();
      ofPair.set(obstacle, known);
      const answer = known.get(move, formed);
      if (answer !== undefined) return answer;
      const { punch, die } = pairOf(pair);
      const found = clearance.forbidden(hitOf(move, formed), punch, die, obstacle);
      known.set(move, formed, found);
      return found;
    },
    wishes: (move, pair) => factsOf(move).wishes[pair] ?? 0,
  };
}

function must<T>(value: T | undefined): T {
  if (value === undefined) throw new Error("invariant: a move or pair of the situation");
  return value;
}
