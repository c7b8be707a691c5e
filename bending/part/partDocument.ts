import type { LengthUnit } from "../core/units";

/**
 * The part document, format `part/1`, as it is typed, stored and exchanged: lengths in `units`, angles in
 * degrees turned through (0 = flat). See README.md of this folder for the conventions.
 */
export type PartDocument = PartCommon & (
  | { readonly profile: ProfileShape; readonly base?: never; readonly flanges?: never; readonly flat?: never }
  | { readonly base: BaseShape; readonly flanges?: readonly FlangeEntry[]; readonly profile?: never; readonly flat?: never }
  | { readonly flat: FlatShape; readonly profile?: never; readonly base?: never; readonly flanges?: never }
);

export interface PartCommon {
  readonly format: "part/1";
  readonly name: string;
  readonly units: LengthUnit;
  readonly material: string;
  readonly thickness: number;
  readonly insideRadius?: number;
  readonly kFactor?: number;
  readonly rule?: AllowanceRule;
  readonly dimension?: DimensionKind;
  readonly toleranceAngle?: number;
  readonly toleranceLength?: number;
  /** Rolling direction in the unfolded sheet: along x, along y, or degrees from x, counter-clockwise. */
  readonly grain?: GrainDirection;
  /** What is cut beside every bend that ends next to unbent sheet, unless its flange says otherwise; absent: nothing. */
  readonly relief?: ReliefEntry;
  /** How neighbouring flanges meet, unless one of them says otherwise; absent: open. */
  readonly corner?: CornerEntry;
}

/**
 * Sizes left out come from the handbook: one thickness wide, half a millimetre deeper than inside radius and
 * thickness. `tear`: nothing is cut away, the sheet tears or is slit; `none`: the corner is left to itself.
 */
export interface ReliefEntry {
  readonly kind: "rectangular" | "round" | "tear" | "none";
  readonly width?: number;
  readonly depth?: number;
}

/**
 * `open`: each flange ends where the neighbour's bend begins. `mitre`: both are carried on or cut back until their
 * nearest edges stand `gap` apart in the folded part.
 */
export type CornerEntry = { readonly kind: "open" } | { readonly kind: "mitre"; readonly gap: number };

export type GrainDirection = "x" | "y" | number;

/** How the bend allowance is found; see part-document conventions in README.md. */
export type AllowanceRule = "shop" | "din6935" | "machinery" | "faa" | "k";
export type DimensionKind = "outside" | "inside" | "tangent";
export type BendDirection = "up" | "down";
export type HemKind = "closed" | "open" | "teardrop";

export interface ProfileShape {
  readonly width: number;
  readonly legs: readonly number[];
  readonly bends: readonly ProfileBend[];
}

export interface ProfileBend {
  readonly angle: number;
  readonly direction: BendDirection;
  readonly insideRadius?: number;
  readonly kFactor?: number;
  readonly hem?: HemKind;
  readonly gap?: number;
  readonly toleranceAngle?: number;
  readonly strokeWith?: string;
}

/** [x, y] or [x, y, bulge of the edge that starts here]. */
export type DocumentVertex = readonly [number, number] | readonly [number, number, number];

export type DocumentHole =
  | { readonly circle: readonly [number, number]; readonly diameter: number }
  | { readonly slot: readonly [readonly [number, number], readonly [number, number]]; readonly width: number }
  | { readonly polygon: readonly DocumentVertex[] };

export interface BaseShape {
  readonly outline: readonly DocumentVertex[];
  readonly holes?: readonly DocumentHole[];
}

export interface FlangeEntry {
  readonly id: string;
  readonly on: string;
  readonly edge: number;
  readonly length?: number;
  readonly outline?: readonly DocumentVertex[];
  readonly angle: number;
  readonly direction: BendDirection;
  readonly dimension?: DimensionKind;
  readonly hem?: HemKind;
  readonly gap?: number;
  readonly start?: number;
  readonly end?: number;
  readonly startAngle?: number;
  readonly endAngle?: number;
  readonly insideRadius?: number;
  readonly kFactor?: number;
  readonly relief?: ReliefEntry;
  /** At both ends of the flange, where a neighbour meets it. */
  readonly corner?: CornerEntry;
  /** Two opposite bends in one stroke: the flange runs on beside the parent, `height` above or below it. */
  readonly offset?: { readonly height: number };
  /** The bend that is formed in the same stroke: the parent's or a child's, turned the other way. */
  readonly strokeWith?: string;
  readonly holes?: readonly DocumentHole[];
  readonly toleranceAngle?: number;
  readonly toleranceLength?: number;
}

export interface FlatShape {
  readonly outline: readonly DocumentVertex[];
  readonly holes?: readonly DocumentHole[];
  readonly bends: readonly FlatBendEntry[];
  /** A point of the face that stays where it is; absent: the largest face. */
  readonly base?: readonly [number, number];
}

export interface FlatBendEntry {
  readonly id: string;
  readonly line: readonly [readonly [number, number], readonly [number, number]];
  readonly angle: number;
  readonly direction: BendDirection;
  readonly hem?: HemKind;
  readonly gap?: number;
  readonly insideRadius?: number;
  readonly kFactor?: number;
  readonly toleranceAngle?: number;
  readonly strokeWith?: string;
}
