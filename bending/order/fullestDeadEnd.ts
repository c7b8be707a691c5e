import { bitCount } from "./bitCount";
import type { OrderProblem } from "./orderProblem";

/**
 * A set of formed bends in which no move can be made, as full as was found within `most` sets looked at, from the flat
 * sheet onwards and always on from the fullest: where a person stands who tries. Meant for a problem without an order.
 */
export function fullestDeadEnd(problem: OrderProblem, most: number, shouldStop: () => boolean): number {
  const seen = new Set([0]);
  const waiting: number[][] = Array.from({ length: problem.bends + 1 }, () => []);
  waiting[0]?.push(0);
  let [fullest, looked] = [0, 0];
  for (let level = 0; level >= 0 && looked < most && !shouldStop(); looked += 1) {
    const formed = waiting[level]?.pop();
    if (formed === undefined) { level -= 1; continue; }
    let any = false;
    problem.moves.forEach(({ mask }, move) => {
      const next = formed | mask;
      if (mask & formed || (any && seen.has(next)) || problem.option(move, formed, 0) === null) return;
      any = true;
      if (seen.has(next)) return;
      seen.add(next);
      waiting[bitCount(next)]?.push(next);
      level = Math.max(level, bitCount(next));
    });
    if (!any && bitCount(formed) > bitCount(fullest)) fullest = formed;
  }
  return fullest;
}
