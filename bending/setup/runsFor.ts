import type { MachineSettings } from "../tooling/machine";
import type { ToolPiece } from "../tooling/tool";
import { composeRuns, type Run } from "./composeRuns";

/** mm. Shortest run that a press can hold: common practice, no source. */
export const SHORTEST_RUN_MM = 5;

/**
 * Runs that real pieces make for a line, each length and count of pieces once: those that cover the whole line, then
 * shorter ones that leave its ends uncovered as far as the settings allow. `used`: pieces that stand elsewhere.
 */
export function runsFor(all: readonly ToolPiece[], lineLength: number, used: ReadonlySet<string>, settings: MachineSettings): readonly Run[] {
  const free = all.filter((piece) => !used.has(piece.id));
  const whole = composeRuns(free, lineLength, settings.maxSectionGap);
  const shorter = composeRuns(free, Math.max(SHORTEST_RUN_MM, lineLength - 2 * settings.maxUncoveredEnd), settings.maxSectionGap);
  const extra = shorter.filter((run) => !whole.some((other) => other.pieces.length <= run.pieces.length && other.length <= run.length));
  return [...whole, ...extra];
}
