import type { KgPerCubicMetre, Mm, MPa } from "../core/units";
import type { SpringbackMaterial } from "./springbackFactor";

export const materialGroups = ["steel", "stainless", "aluminium", "copper", "brass"] as const;
export type MaterialGroup = (typeof materialGroups)[number];

/** Which of the three straight-length formulas a material belongs to. */
export const straightLengthGroups = ["soft", "medium", "hard"] as const;
export type StraightLengthGroup = (typeof straightLengthGroups)[number];

/** The rule that gives K where neither the document nor the shop's own trials do. */
export const materialRules = ["din6935", "machinery", "faa", "k"] as const;
export type MaterialAllowance = { readonly rule: "din6935" | "machinery" | "faa" } | { readonly rule: "k"; readonly k: number };

/** Smallest inside radius for thicknesses over the row before, up to and with `upTo`. */
export interface MinimumRadiusRow {
  readonly upTo: Mm;
  /** The bend line lies across the rolling direction. */
  readonly across: number;
  /** The bend line lies along the rolling direction; null: nothing is known of it. */
  readonly along: number | null;
}

export interface MinimumRadiusTable {
  /** What the radii are: lengths in mm, or multiples of the thickness. */
  readonly as: "mm" | "thickness";
  /** Thinnest first. */
  readonly rows: readonly MinimumRadiusRow[];
}

/** A standard, handbook or certificate; the shop's own measurement or practice; somebody's memory, to be checked. */
export const originKinds = ["published", "shop", "memory"] as const;
export type OriginKind = (typeof originKinds)[number];

/** Where a value is from. */
export interface Origin {
  readonly kind: OriginKind;
  readonly text: string;
}

/** The values that formulas use; each has its origin. */
export const materialFields = [
  "tensile", "yield", "modulus", "density", "straightLengthGroup", "naturalRadiusRatio", "defaultRadiusPerThickness", "allowance", "minimumRadii", "springbackRow",
] as const;
export type MaterialField = (typeof materialFields)[number];

/** What the formulas need to know of a material. Built-in values: see `materials.ts`. */
export interface MaterialFacts {
  /** Short name as typed in documents, e.g. `S235` or `1.4301`. */
  readonly id: string;
  readonly name: string;
  /** How its standard calls it in full, e.g. "S235JR". */
  readonly designation: string;
  /** The standard that it is ordered by, e.g. "EN 10025-2". */
  readonly standard: string;
  readonly group: MaterialGroup;
  /** Tensile strength, lowest and highest. */
  readonly tensile: readonly [MPa, MPa];
  /** Yield or 0.2 % proof strength. */
  readonly yield: MPa;
  /** Elastic modulus, MPa. */
  readonly modulus: MPa;
  readonly density: KgPerCubicMetre;
  readonly straightLengthGroup: StraightLengthGroup;
  /** Natural air-bend radius as a part of the die's V opening. */
  readonly naturalRadiusRatio: number;
  /** Inside radius for a thickness when neither document nor die gives one. */
  readonly defaultRadiusPerThickness: number;
  readonly allowance: MaterialAllowance;
  /** Null: no smallest radius is known. */
  readonly minimumRadii: MinimumRadiusTable | null;
  /** Row of the kR table that its springback is taken from; null: from yield and modulus by elastic recovery. */
  readonly springbackRow: SpringbackMaterial | null;
  readonly origins: Readonly<Record<MaterialField, Origin>>;
}

/** The look-up that a caller gives: materials of the shop, or the built-in ones on the command line. */
export type MaterialLookup = (id: string) => MaterialFacts | undefined;

/** Smallest inside radius for a thickness, with where it comes from. */
export interface MinimumRadius {
  readonly radius: Mm;
  readonly source: string;
}
