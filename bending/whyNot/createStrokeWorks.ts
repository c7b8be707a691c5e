import type { StepChecks } from "../plan/createStepChecks";
import type { Situation } from "../plan/situation";
import { freeShifts } from "../setup/freeShifts";
import type { Die, Punch } from "../tooling/tool";

/** Can a move be made in a state with some pair, the shortest runs that real pieces make standing alone on the bed? Looked for until one pair does; each answer is kept. */
export function createStrokeWorks({ moves, pairs, machine, runs, allowed }: Situation, checks: StepChecks): (move: number, formed: number) => boolean {
  const known = new Map<number, boolean>();
  const hasRoom = (move: number, formed: number, pair: number, tool: Punch | Die): boolean => {
    const half = moves[move]?.halfLength ?? 0;
    const least = Math.min(...runs(tool, half * 2).map(({ length }) => length));
    return Number.isFinite(least) && freeShifts(least / 2 - half + machine.settings.maxUncoveredEnd, [{ offset: 0, length: least, forbidden: checks.forbidden(move, formed, pair, tool) }]).length > 0;
  };
  return (move, formed) => {
    if (!allowed(move, formed)) return false;
    const key = formed * moves.length + move;
    const answer = known.get(key) ?? pairs.some(({ index, punch, die }) => checks.possible(move, formed, index) && hasRoom(move, formed, index, punch) && hasRoom(move, formed, index, die));
    known.set(key, answer);
    return answer;
  };
}
