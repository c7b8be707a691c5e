import { freeShifts } from "../setup/freeShifts";
import type { Die, Punch } from "../tooling/tool";
import type { RunLengths } from "./blockedPattern";
import type { StepChecks } from "./createStepChecks";
import type { Situation } from "./situation";

export interface AloneRoom {
  /** The shortest runs of punch and die that real pieces make for a move. */
  readonly shortest: (move: number, pair: number) => RunLengths | undefined;
  /** Can the pair make the move now, its shortest runs standing alone on the bed, each where it suits it? */
  readonly fits: (move: number, formed: number, pair: number) => boolean;
}

export function createAloneRoom({ moves, pairs, machine, runs }: Situation, checks: StepChecks): AloneRoom {
  const least = (tool: Punch | Die, line: number) => Math.min(...runs(tool, line).map(({ length }) => length));
  const shortest = moves.map(({ halfLength }) => pairs.map(({ punch, die }): RunLengths => ({ punch: least(punch, halfLength * 2), die: least(die, halfLength * 2) })));
  const has = (move: number, formed: number, pair: number, tool: Punch | Die, run: number) => freeShifts(
    run / 2 - (moves[move]?.halfLength ?? 0) + machine.settings.maxUncoveredEnd,
    [{ offset: 0, length: run, forbidden: checks.forbidden(move, formed, pair, tool) }],
  ).length > 0;
  return {
    shortest: (move, pair) => shortest[move]?.[pair],
    fits: (move, formed, pair) => {
      const [length, tools] = [shortest[move]?.[pair], pairs[pair]];
      return length !== undefined && tools !== undefined && Number.isFinite(length.punch) && Number.isFinite(length.die)
        && checks.possible(move, formed, pair) && has(move, formed, pair, tools.punch, length.punch) && has(move, formed, pair, tools.die, length.die);
    },
  };
}
