import type { BedQuestion } from "./bedQuestion";
import { SAME_WEIGHT } from "./createCandidateKeeper";
import { createReachesEnd } from "./createReachesEnd";
import type { KindClass, KindClasses } from "./kindClasses";
import { setupSeconds } from "./setupSeconds";

/** Classes of stations for one bed; no bed of them weighs less than `floor`. */
export interface ClassSet {
  readonly classes: readonly KindClass[];
  readonly floor: number;
}

/** mm. Shut heights of stations on one bed must agree this well, as one ram closes them all. Common practice, no source. */
const SAME_SHUT_HEIGHT_MM = 0.1;

/** The sets of `count` classes that can make the part at all, each station alone on the bed, least floor first; null when told to stop. */
export function classSets(question: BedQuestion, { classes, words }: KindClasses, count: number): readonly ClassSet[] | null {
  const { situation, keeper, least, budget, sets } = question;
  const reachesEnd = sets === null ? () => true : createReachesEnd(situation, sets, words);
  const found: ClassSet[] = [];
  const heightOf = ({ pair }: KindClass) => (situation.pairs[pair]?.punch.height ?? 0) + (situation.pairs[pair]?.die.height ?? 0);
  const add = (chosen: readonly KindClass[], from: number): boolean => {
    if (budget.shouldStop()) return false;
    if (chosen.length === count) {
      const floor = setupSeconds(situation.machine, count, sum(chosen)) + least * budget.batch;
      if (floor < keeper.worst() && reachesEnd(chosen)) found.push({ classes: chosen, floor });
      return true;
    }
    for (let next = from; next < classes.length; next += 1) {
      const one = classes[next];
      if (one === undefined || (chosen[0] && Math.abs(heightOf(chosen[0]) - heightOf(one)) > SAME_SHUT_HEIGHT_MM)) continue;
      const fewest = sum([...chosen, one]) + 2 * (count - chosen.length - 1);
      if (setupSeconds(situation.machine, count, fewest) + least * budget.batch >= keeper.worst() - SAME_WEIGHT) continue;
      if (!add([...chosen, one], next + 1)) return false;
    }
    return true;
  };
  return add([], 0) ? found.sort((a, b) => a.floor - b.floor) : null;
}

const sum = (classes: readonly KindClass[]) => classes.reduce((pieces, { kinds }) => pieces + (kinds[0]?.pieces ?? 0), 0);
