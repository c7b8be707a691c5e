import type { StepOption } from "../order/orderProblem";
import type { Interval } from "../geometry/interval";
import { freeShifts } from "../setup/freeShifts";
import type { StationKind } from "../setup/stationKinds";
import type { StepChecks } from "./createStepChecks";
import { fingerCount } from "./fingerCount";
import { gaugeDemerits } from "./gaugeDemerits";
import type { GaugeNumbers } from "./gaugeNumbers";
import type { Situation } from "./situation";

/** What a move needs of a station of some pair: room beside its line. Needs that ask the same are one object. */
export interface Need {
  readonly halfLength: number;
  readonly punch: readonly Interval[];
  readonly die: readonly Interval[];
}

/** Questions about one station alone on the bed. */
export interface Alone {
  /** Null when the pair cannot make the move now, whatever the station's lengths. */
  readonly need: (move: number, formed: number, pair: number) => Need | null;
  readonly holds: (kind: StationKind, need: Need) => boolean;
  /** How the step is gauged and what it leaves unmet at the least, with a pair that can make it. */
  readonly option: (move: number, formed: number, pair: number) => StepOption;
}

export function createAlone(situation: Situation, checks: StepChecks, numbers: GaugeNumbers): Alone {
  const { moves, pairs, machine, allowed } = situation;
  const interned = new Map<string, Need>();
  const needs = pairs.map(() => new Map<number, Need | null>());
  const options = pairs.map(() => new Map<number, StepOption>());
  const held = new WeakMap<StationKind, Map<Need, boolean>>();
  const find = (move: number, formed: number, pair: number): Need | null => {
    const tools = pairs[pair];
    if (!tools || !allowed(move, formed) || !checks.possible(move, formed, pair)) return null;
    const need = {
      halfLength: moves[move]?.halfLength ?? 0,
      punch: checks.forbidden(move, formed, pair, tools.punch),
      die: checks.forbidden(move, formed, pair, tools.die),
    };
    const key = `${need.halfLength}|${need.punch.join()}|${need.die.join()}`;
    const known = interned.get(key) ?? need;
    interned.set(key, known);
    return known;
  };
  return {
    need: (move, formed, pair) => {
      const known = needs[pair];
      const key = formed * moves.length + move;
      const answer = known?.get(key);
      if (answer !== undefined) return answer;
      const found = find(move, formed, pair);
      known?.set(key, found);
      return found;
    },
    holds: (kind, need) => {
      const known = held.get(kind) ?? new Map<Need, boolean>();
      held.set(kind, known);
      const answer = known.get(need);
      if (answer !== undefined) return answer;
      const reach = Math.min(kind.punchLength, kind.dieLength) / 2 - need.halfLength + machine.settings.maxUncoveredEnd;
      const found = freeShifts(reach, [
        { offset: 0, length: kind.punchLength, forbidden: need.punch },
        { offset: 0, length: kind.dieLength, forbidden: need.die },
      ]).length > 0;
      known.set(need, found);
      return found;
    },
    option: (move, formed, pair) => {
      const known = options[pair];
      const key = formed * moves.length + move;
      const answer = known?.get(key);
      if (answer !== undefined) return answer;
      const gauge = checks.gauges(move, formed, pair)[0];
      const fingers = gauge === undefined ? 0 : fingerCount(gauge, machine.gauge);
      const found = { gauge: numbers(gauge), demerit: checks.wishes(move, pair) + gaugeDemerits(fingers) + checks.unkept(move, formed, gauge) };
      known?.set(key, found);
      return found;
    },
  };
}
