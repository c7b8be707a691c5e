import type { MaterialFacts } from "../handbook/material";
import type { PartDocument } from "../part/partDocument";
import type { Machine } from "../tooling/machine";
import type { Tool } from "../tooling/tool";
import type { PlanDocument, PlanReason } from "./planDocument";

/** A plan with what it was made of, as it was. */
export interface StoredPlan {
  readonly plan: PlanDocument;
  readonly document: PartDocument;
  readonly material: MaterialFacts;
  readonly machine: Machine;
  /** The tools that the plan uses. */
  readonly tools: readonly Tool[];
}

/** The shop as it is when a stored plan is looked over. */
export interface ShopNow {
  /** The planner's version. */
  readonly engine: string;
  readonly machine: Machine;
  /** Tools with the pieces that are in service; what is not here is not there. */
  readonly tools: readonly Tool[];
  /** Pieces of the plan that may not be used, with the reason: "at regrind", "no longer there". */
  readonly missing: readonly { readonly piece: string; readonly why: string }[];
  /** What the formula's air-bend force is multiplied by; 1 unless said. */
  readonly airForceFactor?: number;
}

/** What is wrong now, and with which step (index into the plan's steps); null: not of one step. */
export interface StoredFinding {
  readonly step: number | null;
  readonly reason: PlanReason;
}

/** Something that is not as it was when the plan was made. `what` in plain words, values as a person reads them. */
export interface StoredChange {
  readonly what: string;
  readonly before: string;
  readonly now: string;
}

export interface StoredCheck {
  /** True: every step can be made as the plan says, today. */
  readonly holds: boolean;
  readonly engine: { readonly planned: string; readonly now: string };
  /** Steps gone through. */
  readonly steps: number;
  readonly wrong: readonly StoredFinding[];
  readonly changed: readonly StoredChange[];
}
