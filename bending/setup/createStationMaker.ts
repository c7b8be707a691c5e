import type { MachineSettings } from "../tooling/machine";
import type { Die, Punch, ToolPiece } from "../tooling/tool";
import { composeRuns, type Run } from "./composeRuns";
import type { Station } from "./layout";
import type { StationKind } from "./stationKinds";

/** mm. Runs that agree this well are of one length. */
const SAME_LENGTH_MM = 5e-4;

/**
 * Real pieces for stations of these kinds, no piece twice; null when the stock does not hold them together.
 * One station after the other takes its pieces, in every order of the stations until one comes out.
 */
export function createStationMaker(tools: (pair: number) => { readonly punch: Punch; readonly die: Die }, settings: MachineSettings) {
  const known = new Map<string, readonly Run[]>();
  const runOf = (tool: Punch | Die, length: number, used: ReadonlySet<ToolPiece>): Run | null => {
    const free = tool.pieces.filter((piece) => !used.has(piece));
    const taken = free.length === tool.pieces.length ? "" : tool.pieces.filter((piece) => used.has(piece)).map(({ id }) => id).join("\n");
    const key = `${tool.kind}\t${tool.id}\t${length}\t${taken}`;
    const runs = known.get(key) ?? composeRuns(free, length, settings.maxSectionGap);
    known.set(key, runs);
    const right = runs.filter((run) => Math.abs(run.length - length) < SAME_LENGTH_MM);
    return right.reduce<Run | null>((best, run) => (best === null || run.pieces.length < best.pieces.length ? run : best), null);
  };
  const inTurn = (kinds: readonly StationKind[], turn: readonly number[]): readonly Station[] | null => {
    const used = new Set<ToolPiece>();
    const made: Station[] = [];
    for (const index of turn) {
      const kind = kinds[index];
      if (kind === undefined) return null;
      const { punch, die } = tools(kind.pair);
      const [above, below] = [runOf(punch, kind.punchLength, used), runOf(die, kind.dieLength, used)];
      if (above === null || below === null) return null;
      for (const piece of [...above.pieces, ...below.pieces]) used.add(piece);
      made[index] = { pair: kind.pair, punch: above, die: below };
    }
    return made;
  };
  return (kinds: readonly StationKind[]): readonly Station[] | null => {
    for (const turn of turns(kinds.length)) {
      const made = inTurn(kinds, turn);
      if (made !== null) return made;
    }
    return null;
  };
}

/** Every order up to three stations; of more, each one first in turn. */
function turns(count: number): readonly (readonly number[])[] {
  const plain = Array.from({ length: count }, (_, i) => i);
  if (count > 3) return plain.map((first) => [first, ...plain.filter((i) => i !== first)]);
  if (count < 2) return [plain];
  return turns(count - 1).flatMap((shorter) => Array.from({ length: count }, (_, place) => [...shorter.slice(0, place), count - 1, ...shorter.slice(place)]));
}
