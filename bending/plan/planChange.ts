import type { LengthUnit } from "../core/units";

/**
 * The least change of one kind with which there is a plan: found by planning with the change made, and proven least by
 * planning with a little less. Every one is really planned before it is named.
 */
export interface PlanChange {
  readonly kind: ChangeKind;
  /** What it would cost the shop, and how changes are sorted: another order, pieces, tools, a machine, the part, a setting. */
  readonly group: ChangeGroup;
  /** What is changed: ids of bends, faces or tools; a document path where one field is changed. */
  readonly what: { readonly bends?: readonly string[]; readonly faces?: readonly string[]; readonly tools?: readonly string[]; readonly path?: string };
  /** The least that works; null where there is nothing to measure. */
  readonly amount: ChangeAmount | null;
  /** Further sizes that the amount goes with, e.g. how high over the tip a relief reaches. */
  readonly with: readonly ChangeAmount[];
  /** The person's order with the fewest bends moved, for changes of order. */
  readonly order?: readonly string[];
  /** One whole sentence, in the part document's units. */
  readonly message: string;
  /** The plan that was found with it. `optimal` is proven, `feasible` is the first that was found. */
  readonly plan: { readonly status: "optimal" | "feasible"; readonly cost: number; readonly order: readonly string[] };
  readonly found: ChangeProof;
}

export type ChangeGroup = "order" | "stock" | "tool" | "machine" | "part" | "setting";

export type ChangeKind =
  | "free-choice" | "move-bends" | "one-by-one"
  | "section"
  | "punch-relief" | "punch-height" | "punch-width" | "die-opening" | "die-height" | "die-width" | "tool-angle" | "tool-rating" | "hem-die"
  | "daylight" | "stroke" | "bed-length" | "between-frames" | "throat" | "force" | "section-gap"
  | "shorter-flange" | "longer-flange" | "leave-out"
  | "clearance";

export interface ChangeAmount {
  /** e.g. "relief", "height of the relief", "length": as the sentence calls it. */
  readonly name: string;
  readonly value: number;
  readonly unit: LengthUnit | "deg" | "kN" | "kN/m" | "bends" | "pieces";
  /** The value before the change, where there was one. */
  readonly from?: number;
}

/** How a change was found and how it is known to be the least. */
export interface ChangeProof {
  /** Plans made for it. */
  readonly plans: number;
  /** The nearest smaller amount that was planned and proven to give no plan; absent where nothing is smaller, or the time ended first. */
  readonly notEnough?: number;
  /** To what the amount is known. */
  readonly resolution?: number;
}
