import { DEMERIT_SECONDS, type OrderProblem } from "./orderProblem";

/** Weights as whole numbers that fit 31 bits: demerits above, ticks of time below. Never more than the true weight. */
export interface Ticks {
  readonly of: (seconds: number) => number;
  readonly demerit: (demerits: number) => number;
  readonly weight: (ticks: number) => number;
}

/** Ticks a second, finest first: with the first that all times are whole numbers of, nothing is rounded. */
const RATES = [1, 2, 4, 10, 20, 100, 200, 1000];
/** Largest part of a table's number that time may fill; 255 demerits are above it. */
const MOST_TICKS = 2 ** 23;
/** Far over rounding noise, far under a tick. */
const NOISE = 1e-6;

/** The coarsest tick that all times of a problem are whole numbers of, else the finest that fits, times rounded down. */
export function createTicks({ times, bends, moves }: OrderProblem): Ticks {
  const all = [times.flip, times.turn, times.stroke, times.gaugeMove];
  const strokes = Math.max(1, ...moves.map((move) => move.strokes ?? 1));
  const longest = (bends + 1) * (times.flip + 2 * times.turn + strokes * times.stroke + times.gaugeMove);
  const exact = RATES.find((rate) => all.every((seconds) => Math.abs(seconds * rate - Math.round(seconds * rate)) < NOISE) && longest * rate < MOST_TICKS);
  const rate = exact ?? (MOST_TICKS - bends * 8) / Math.max(1, longest);
  const mostDemerits = Math.floor(255 / Math.max(1, bends));
  return {
    of: (seconds) => Math.floor(seconds * rate + NOISE),
    demerit: (demerits) => Math.min(demerits, mostDemerits) * MOST_TICKS,
    weight: (ticks) => Math.floor(ticks / MOST_TICKS) * DEMERIT_SECONDS + (ticks % MOST_TICKS) / rate,
  };
}
