import type { PlanReason } from "./planDocument";

/**
 * Where an order ends and everything that stands in the way there. Lengths in the plan's `units`, angles in degrees.
 * For a person's own order it is their first step that fails; for a free plan the fullest state that strokes lead to and
 * from which none goes on.
 */
export interface PlanFailure {
  /** The strokes that work, in order ("a+b" for one stroke of several bends). */
  readonly done: readonly string[];
  /** Place of the failing step in the person's order, counted from 1; null when the planner was free. */
  readonly step: number | null;
  /** Strokes that cannot be made next: the one of the person's order, or every one that is left. */
  readonly strokes: readonly FailedStroke[];
  /** In whole sentences: how far it gets, what fails, what would come sooner or later. */
  readonly message: string;
}

export interface FailedStroke {
  readonly bends: readonly string[];
  /** Everything that stops it, over both fronts and every likely pair of tools; what comes nearest to working first. */
  readonly reasons: readonly FailureReason[];
  /** The least changes of place with which this stroke can be made; empty when its place is not what stops it. */
  readonly wouldWork: readonly FailurePlace[];
}

/** One kind of thing in the way, with all fronts and pairs that meet it. `evidence` is of the worst of them. */
export interface FailureReason extends PlanReason {
  /** Faces on the operator's side with which it is met. */
  readonly fronts: readonly string[];
  readonly pairs: readonly { readonly punch: string; readonly die: string }[];
  /** Depth of the least of them: how near it comes to working; absent where nothing is met. */
  readonly leastDepth?: number;
}

/** The stroke works when it is made before these bends and after those. */
export interface FailurePlace {
  readonly before: readonly string[];
  readonly after: readonly string[];
}
