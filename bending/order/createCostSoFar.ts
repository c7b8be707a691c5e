import { createTicks } from "./createTicks";
import { handlingTable } from "./handlingTable";
import { mayShare } from "./mayShare";
import { ANY_GAUGE, type LeastOption, type OrderProblem } from "./orderProblem";

/** Bounds from below on the cost of the first part of an order, worked out for every state from what is known without asking. */
export interface CostSoFar {
  /** Least weight of forming `formed` and then making `move`, its own stroke included; Infinity when there is no way. */
  readonly with: (formed: number, move: number) => number;
  /** Least weight of forming `formed` such that `move` follows at this gauge setting, what is done between included. */
  readonly upTo: (formed: number, move: number, gauge: number) => number;
}

/** Largest table worked out: 160 MB. */
const MOST_ENTRIES = 40_000_000;
/** No way. */
const NEVER = 0x7fffffff;

/**
 * A dynamic programme over (formed set, last move) in which a step costs what is known of it without asking. Null when the
 * table would be too large, or when told to stop.
 */
export function createCostSoFar(problem: OrderProblem, shouldStop: () => boolean): CostSoFar | null {
  const { bends, moves, times } = problem;
  const count = moves.length;
  const sets = 2 ** bends;
  if (sets * count > MOST_ENTRIES) return null;
  const ticks = createTicks(problem);
  const handling = handlingTable(problem);
  const hand = Int32Array.from(handling.seconds, ticks.of);
  const strokes = Int32Array.from(moves, (move) => ticks.of((move.strokes ?? 1) * times.stroke));
  const gaugeMove = ticks.of(times.gaugeMove);
  const masks = Int32Array.from(moves, ({ mask }) => mask);
  const table = new Int32Array(sets * count).fill(NEVER);
  const nothing: LeastOption = { demerit: 0, gauges: null };
  const least = problem.least ?? (() => nothing);
  /** The moves that can have been the last one before a state, with what they cost so far. */
  const last = new Int32Array(count);
  const cost = new Int32Array(count);
  const gauges: (readonly number[] | null)[] = Array.from({ length: count }, () => null);
  const gather = (formed: number): number => {
    let found = 0;
    for (let move = 0; move < count; move += 1) {
      const value = table[formed * count + move] as number;
      if (value === NEVER) continue;
      last[found] = move;
      cost[found] = value;
      gauges[found] = least(move, formed & ~(masks[move] as number))?.gauges ?? null;
      found += 1;
    }
    return found;
  };
  /** Cheapest way to stand before a move whose gauge settings are these. */
  const before = (found: number, move: number, wanted: readonly number[] | null): number => {
    let best = NEVER;
    for (let i = 0; i < found; i += 1) {
      const so = (cost[i] as number) + (hand[(last[i] as number) * count + move] as number);
      if (so >= best) continue;
      const whole = mayShare(gauges[i] as readonly number[] | null, wanted) ? so : so + gaugeMove;
      if (whole < best) best = whole;
    }
    return best;
  };
  for (let formed = 0; formed < sets - 1; formed += 1) {
    if ((formed & 1023) === 0 && shouldStop()) return null;
    const found = formed === 0 ? 0 : gather(formed);
    if (found === 0 && formed !== 0) continue;
    for (let move = 0; move < count; move += 1) {
      const mask = masks[move] as number;
      if (mask & formed) continue;
      const option = least(move, formed);
      if (option === null) continue;
      const so = formed === 0 ? gaugeMove : before(found, move, option.gauges);
      table[(formed | mask) * count + move] = so + (strokes[move] as number) + ticks.demerit(option.demerit);
    }
  }
  return {
    with: (formed, move) => {
      const value = table[(formed | (masks[move] as number)) * count + move] as number;
      return value === NEVER ? Infinity : ticks.weight(value);
    },
    upTo: (formed, move, gauge) => {
      if (formed === 0) return times.gaugeMove;
      const value = before(gather(formed), move, gauge === ANY_GAUGE ? null : [gauge]);
      return value === NEVER ? Infinity : ticks.weight(value);
    },
  };
}
