export interface DieLimit {
  readonly name: string;
  /** V in mm. */
  readonly vOpening: number;
  /** What the die bears over this length, kN. */
  readonly bears: number;
  /** The highest of the published forms over this V, kN. */
  readonly needs: number;
}

export interface ForceLimit {
  readonly name: string;
  /** kN. */
  readonly most: number;
}

interface Rated {
  readonly code: string;
  readonly maxForcePerMetreKN: number;
  readonly vOpeningMm: number | null;
}

/** Dies that lie within the chart, with what they bear and need over a bend of this length, narrowest first. */
export function dieLimits(dies: readonly Rated[], lengthMm: number, [from, to]: readonly [number, number], needs: (vOpening: number) => number): readonly DieLimit[] {
  return dies
    .flatMap(({ code, maxForcePerMetreKN, vOpeningMm }) => (vOpeningMm === null || vOpeningMm < from || vOpeningMm > to ? [] : [{ name: code, vOpening: vOpeningMm, bears: (maxForcePerMetreKN * lengthMm) / 1000, needs: needs(vOpeningMm) }]))
    .sort((a, b) => a.vOpening - b.vOpening || a.name.localeCompare(b.name));
}
