import type { MachineSettings } from "../tooling/machine";
import type { ToolPiece } from "../tooling/tool";
import { composeRuns, type Run } from "./composeRuns";
import type { Station, StationWish } from "./layout";

/** mm. Shortest run that a press can hold: common practice, no source. */
const SHORTEST_RUN_MM = 5;

/**
 * The stations that real pieces make for a wish, without the pieces already used elsewhere: those that cover
 * the whole line first, then those that leave its ends uncovered as far as the settings allow.
 */
export function stationsFor(wish: StationWish, used: ReadonlySet<string>, settings: MachineSettings): readonly Station[] {
  const punches = runsFor(wish.punch.pieces, wish.lineLength, used, settings);
  const dies = runsFor(wish.die.pieces, wish.lineLength, used, settings);
  return punches.flatMap((punch) => dies.map((die): Station => ({ pair: wish.pair, punch, die })))
    .sort((a, b) => pieces(a) - pieces(b) || a.punch.length + a.die.length - b.punch.length - b.die.length);
}

const pieces = (station: Station) => station.punch.pieces.length + station.die.pieces.length;

/** Runs for a line, each length and count of pieces once. */
export function runsFor(all: readonly ToolPiece[], lineLength: number, used: ReadonlySet<string>, settings: MachineSettings): readonly Run[] {
  const free = all.filter((piece) => !used.has(piece.id));
  const whole = composeRuns(free, lineLength, settings.maxSectionGap);
  const shorter = composeRuns(free, Math.max(SHORTEST_RUN_MM, lineLength - 2 * settings.maxUncoveredEnd), settings.maxSectionGap);
  const extra = shorter.filter((run) => !whole.some((other) => other.pieces.length <= run.pieces.length && other.length <= run.length));
  return [...whole, ...extra];
}
