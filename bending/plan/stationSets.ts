import type { Station } from "../setup/layout";
import type { StationKind } from "../setup/stationKinds";
import type { KindClass } from "./kindClasses";

export interface StationSet {
  readonly kinds: readonly StationKind[];
  readonly pieces: number;
}

/** One kind of each class, in every way that needs no more than `most` pieces: fewest pieces first, then the shorter. */
export function stationSets(classes: readonly KindClass[], most: number): readonly StationSet[] {
  const fewest = classes.map(({ kinds }) => kinds[0]?.pieces ?? 0);
  const found: StationSet[] = [];
  const add = (chosen: readonly StationKind[], pieces: number): void => {
    const next = classes[chosen.length];
    if (next === undefined) { found.push({ kinds: chosen, pieces }); return; }
    const rest = fewest.slice(chosen.length + 1).reduce((sum, count) => sum + count, 0);
    for (const kind of next.kinds) if (pieces + kind.pieces + rest <= most) add([...chosen, kind], pieces + kind.pieces);
  };
  add([], 0);
  const length = ({ kinds }: StationSet) => kinds.reduce((sum, { punchLength, dieLength }) => sum + punchLength + dieLength, 0);
  return found.sort((a, b) => a.pieces - b.pieces || length(a) - length(b));
}

export const piecesOf = (stations: readonly Station[]): number => stations.reduce((sum, { punch, die }) => sum + punch.pieces.length + die.pieces.length, 0);
