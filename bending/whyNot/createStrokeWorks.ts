import { createAloneRoom } from "../plan/createAloneRoom";
import type { StepChecks } from "../plan/createStepChecks";
import type { Situation } from "../plan/situation";

/** Can a move be made in a state with some pair, the shortest runs that real pieces make standing alone on the bed? Looked for until one pair does; each answer is kept. */
export function createStrokeWorks(situation: Situation, checks: StepChecks): (move: number, formed: number) => boolean {
  const { moves, pairs, allowed } = situation;
  const room = createAloneRoom(situation, checks);
  const known = new Map<number, boolean>();
  return (move, formed) => {
    if (!allowed(move, formed)) return false;
    const key = formed * moves.length + move;
    const answer = known.get(key) ?? pairs.some(({ index }) => room.fits(move, formed, index));
    known.set(key, answer);
    return answer;
  };
}
