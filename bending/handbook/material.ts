import type { KgPerCubicMetre, Mm, MPa } from "../core/units";

export type MaterialGroup = "steel" | "stainless" | "aluminium" | "copper" | "brass";

/** What the formulas need to know of a material. Values with their sources: see `materials.ts`. */
export interface MaterialFacts {
  /** Short standard name as typed in documents, e.g. `S235` or `1.4301`. */
  readonly id: string;
  readonly name: string;
  /** The standard that the values are of, e.g. "EN 10025-2". */
  readonly standard: string;
  readonly group: MaterialGroup;
  /** Tensile strength, lowest and highest. */
  readonly tensile: readonly [MPa, MPa];
  /** Yield or 0.2 % proof strength. */
  readonly yield: MPa;
  /** Elastic modulus, MPa. */
  readonly modulus: MPa;
  readonly density: KgPerCubicMetre;
  /** Which of the three straight-length formulas (soft, medium, hard) the material belongs to. */
  readonly straightLengthGroup: "soft" | "medium" | "hard";
  /** Natural air-bend radius as a part of the die's V opening. */
  readonly naturalRadiusRatio: number;
  /** Inside radius for a thickness when neither document nor die gives one. */
  readonly defaultRadiusPerThickness: number;
  readonly source: string;
}

/** The look-up that a caller gives: materials of the shop, or the built-in ones on the command line. */
export type MaterialLookup = (id: string) => MaterialFacts | undefined;

/** Smallest inside radius for a thickness, with where it comes from. */
export interface MinimumRadius {
  readonly radius: Mm;
  readonly source: string;
}
