import { handlingBetween } from "./handlingBetween";
import { handlingSeconds } from "./handlingSeconds";
import type { OrderProblem } from "./orderProblem";

export interface HandlingTable {
  /** Seconds between two moves, by (first x moves + second); the same both ways. */
  readonly seconds: Float64Array;
  /** By move: the number of its pose, equal poses having equal numbers. */
  readonly pose: Int32Array;
  readonly poses: number;
}

/** What is done between every two moves of a problem, worked out once. */
export function handlingTable({ moves, times }: OrderProblem): HandlingTable {
  const numbers = new Map<string, number>();
  const pose = Int32Array.from(moves, ({ pose: { up, heading } }) => {
    const key = `${up}/${heading}`;
    const known = numbers.get(key) ?? numbers.size;
    numbers.set(key, known);
    return known;
  });
  const seconds = new Float64Array(moves.length ** 2);
  moves.forEach((from, a) => moves.forEach((to, b) => { seconds[a * moves.length + b] = handlingSeconds(handlingBetween(from.pose, to.pose), times); }));
  return { seconds, pose, poses: numbers.size };
}
