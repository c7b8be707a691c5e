import type { StationKind } from "../setup/stationKinds";

/** A kind of station, and the kinds that are never better than it while its pieces are there. */
export interface KindFamily {
  readonly best: StationKind;
  readonly spares: readonly StationKind[];
}

/**
 * Kinds of one pair each, told apart by what they are good for: of two that hold the same lines the one with no more pieces,
 * which stands wherever the other may stand, is the best of a family. `lines`: the lengths that stations have to hold.
 */
export function kindFamilies(kinds: readonly StationKind[], lines: readonly number[], maxUncoveredEnd: number): readonly KindFamily[] {
  const families: { readonly best: StationKind; readonly spares: StationKind[] }[] = [];
  const holds = (kind: StationKind) => lines.filter((line) => held(kind) >= line - 2 * maxUncoveredEnd).length;
  const ordered = [...kinds].sort((a, b) => a.pair - b.pair || a.pieces - b.pieces || a.punchLength + a.dieLength - b.punchLength - b.dieLength);
  for (const kind of ordered) {
    const family = families.find(({ best }) => best.pair === kind.pair && holds(best) === holds(kind) && standsWithin(best, kind));
    if (family) family.spares.push(kind);
    else families.push({ best: kind, spares: [] });
  }
  return families;
}

const held = ({ punchLength, dieLength }: StationKind) => Math.min(punchLength, dieLength);

/**
 * Wherever the second stands round a line that both hold, the first can stand within it: no longer above nor below, and what
 * it reaches less to either side it is shorter by above and below.
 */
function standsWithin(a: StationKind, b: StationKind): boolean {
  const [above, below] = [b.punchLength - a.punchLength, b.dieLength - a.dieLength];
  return above >= 0 && below >= 0 && a.length <= b.length && held(b) - held(a) <= Math.min(above, below) + 1e-9;
}
