import { ANY_GAUGE, type StepOption } from "../order/orderProblem";
import type { LearningProblem } from "../order/searchLearning";
import type { GaugeOption } from "../setup/gaugeOption";
import { blockedPattern } from "./blockedPattern";
import { createAloneRoom } from "./createAloneRoom";
import { createLeast } from "./createLeast";
import type { StepChecks } from "./createStepChecks";
import { fingerCount } from "./fingerCount";
import { gaugeDemerits } from "./gaugeDemerits";
import type { GaugeNumbers } from "./gaugeNumbers";
import type { Situation } from "./situation";

/**
 * The order question with the bed left out: every stroke has the best pair and the shortest runs that real
 * pieces make, punch and die each where it suits it, alone on the bed and without a walk. Where a longer run may
 * stand a shorter one within it may, so no plan costs less a part; if it has no order, none has.
 */
export function relaxedProblem(situation: Situation, checks: StepChecks, numbers: GaugeNumbers): LearningProblem {
  const { moves, pairs, machine, part, allowed } = situation;
  const room = createAloneRoom(situation, checks);
  const fingersOf = (gauge: GaugeOption | undefined): number => (gauge === undefined ? 0 : fingerCount(gauge, machine.gauge));
  const withPair = (move: number, formed: number, pair: number): StepOption | null => {
    if (!room.fits(move, formed, pair)) return null;
    const gauge = checks.gauges(move, formed, pair)[0];
    return { gauge: numbers(gauge), demerit: checks.wishes(move, pair) + gaugeDemerits(fingersOf(gauge)) + checks.unkept(move, formed, gauge) };
  };
  const least = createLeast(situation, checks, numbers);
  const known = new Map<number, StepOption | null>();
  const find = (move: number, formed: number): StepOption | null => {
    const best = bestOf(pairs.length, (pair) => withPair(move, formed, pair), least.of(move, formed)?.demerit ?? 0);
    if (best === null) {
      const pattern = blockedPattern(situation, checks, move, formed, pairs, (pair) => room.shortest(move, pair));
      if (pattern) least.block(move, pattern);
      return null;
    }
    if (!checks.gaugesAgree(move, formed)) return { ...best.option, gauge: ANY_GAUGE };
    least.settle(move, formed, best.option.gauge, fingersOf(checks.gauges(move, formed, best.pair)[0]));
    return best.option;
  };
  return {
    least: least.of,
    learned: least.learned,
    bends: part.bends.length,
    moves,
    stations: 1,
    times: machine.times,
    walk: () => 0,
    option: (move, formed) => {
      if (!allowed(move, formed)) return null;
      const key = formed * moves.length + move;
      const answer = known.get(key);
      if (answer !== undefined) return answer;
      const found = least.of(move, formed) === null ? null : find(move, formed);
      known.set(key, found);
      return found;
    },
  };
}

interface WithPair { readonly option: StepOption; readonly pair: number }

/** The option of least demerit and its pair, looked for until one has the least that there can be. */
function bestOf(pairs: number, option: (pair: number) => StepOption | null, least: number): WithPair | null {
  let best: WithPair | null = null;
  for (let pair = 0; pair < pairs && (best === null || best.option.demerit > least); pair += 1) {
    const found = option(pair);
    if (found && (best === null || found.demerit < best.option.demerit)) best = { option: found, pair };
  }
  return best;
}
