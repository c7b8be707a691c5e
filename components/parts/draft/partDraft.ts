import type { LengthUnit } from "@/bending/core/units";
import type { AllowanceRule, BendDirection, CornerEntry, DimensionKind, DocumentHole, DocumentVertex, FlatShape, HemKind, ReliefEntry } from "@/bending/part/partDocument";

/**
 * A part as it is being typed: numbers are still the text that was typed, so that nothing entered is lost while
 * it is wrong. An empty text means "not given". `key`s only tell rows apart on the screen.
 */
export interface PartDraft {
  readonly number: string;
  readonly name: string;
  readonly note: string;
  readonly units: LengthUnit;
  readonly material: string;
  readonly thickness: string;
  readonly radiusFrom: "die" | "typed";
  readonly insideRadius: string;
  readonly kFactor: string;
  readonly rule: AllowanceRule | "default";
  readonly dimension: DimensionKind;
  readonly toleranceAngle: string;
  readonly toleranceLength: string;
  readonly grain: "absent" | "x" | "y" | "angle";
  readonly grainAngle: string;
  readonly relief: ReliefDraft;
  readonly corner: CornerDraft;
  readonly shape: "profile" | "base" | "flat";
  readonly width: string;
  readonly legs: readonly LegDraft[];
  readonly base: BaseDraft;
  readonly flanges: readonly FlangeDraft[];
  /** A flat with bend lines that came in as a drawing or document: contours and lines are kept as they are. */
  readonly flat: FlatShape | null;
  /** What is typed for the flat's bend lines, in their order. */
  readonly flatBends: readonly BendDraft[];
}

/** `absent`: not said here, so the part's (or nothing) holds. */
export interface ReliefDraft { readonly kind: ReliefEntry["kind"] | "absent"; readonly width: string; readonly depth: string }

export interface CornerDraft { readonly kind: CornerEntry["kind"] | "absent"; readonly gap: string }

/** A leg, and the bend that ends it (the last leg has none that counts). */
export interface LegDraft {
  readonly key: string;
  readonly length: string;
  readonly bend: BendDraft;
}

export interface BendDraft {
  readonly angle: string;
  readonly direction: BendDirection;
  readonly insideRadius: string;
  readonly kFactor: string;
  readonly hem: HemKind | "none";
  readonly gap: string;
  readonly toleranceAngle: string;
  /** The bend that is formed by the same stroke; empty: none. */
  readonly strokeWith: string;
}

export interface BaseDraft {
  readonly kind: "rectangle" | "vertices";
  readonly width: string;
  readonly depth: string;
  readonly vertices: readonly VertexDraft[];
  readonly holes: readonly HoleDraft[];
}

export interface VertexDraft { readonly key: string; readonly x: string; readonly y: string; readonly bulge: string }

/** Round holes, slots and upright rectangles are edited here; any other polygon is kept as the document gave it. */
export type HoleDraft =
  | { readonly key: string; readonly kind: "circle"; readonly x: string; readonly y: string; readonly diameter: string }
  /** From the middle of one round end to the middle of the other. */
  | { readonly key: string; readonly kind: "slot"; readonly x: string; readonly y: string; readonly toX: string; readonly toY: string; readonly width: string }
  /** By its lower left corner. */
  | { readonly key: string; readonly kind: "rectangle"; readonly x: string; readonly y: string; readonly width: string; readonly height: string }
  | { readonly key: string; readonly kind: "kept"; readonly hole: DocumentHole };

export interface FlangeDraft extends BendDraft {
  readonly key: string;
  readonly id: string;
  readonly on: string;
  readonly edge: number;
  readonly length: string;
  readonly start: string;
  readonly end: string;
  readonly startAngle: string;
  readonly endAngle: string;
  readonly dimension: DimensionKind | "part";
  readonly relief: ReliefDraft;
  readonly corner: CornerDraft;
  /** Height of an offset; empty: a plain bend. */
  readonly offsetHeight: string;
  readonly toleranceLength: string;
  readonly holes: readonly HoleDraft[];
  /** An outline of its own, kept as the document gave it; it then takes the place of the length. */
  readonly outline: readonly DocumentVertex[] | null;
}
