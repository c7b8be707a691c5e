import type { Plain } from "../core/plain";
import type { LengthUnit } from "../core/units";
import type { AllowanceBasis } from "../handbook/allowanceBasis";
import type { PlanChange } from "./planChange";
import type { PlanCounts } from "./planCounts";
import type { PlanFailure } from "./planFailure";
import type { PlanRobustness } from "./planRobustness";
import type { PlanTolerance } from "./planTolerance";

/**
 * The plan document, format `plan/1`: what is stored, drawn and printed. Lengths in `units` (the part
 * document's), angles in degrees, forces in kN, times in seconds.
 *
 * A step forms its bend upwards, so which side is up follows from the bend's direction. `front` is the face
 * next to the bend line on the operator's side, `bendZ` is where the bend line lies along the bed (from the
 * middle, to the operator's right): with these the part's place in the machine is fixed.
 */
export interface PlanDocument {
  readonly format: "plan/1";
  readonly engine: string;
  readonly units: LengthUnit;
  readonly part: string;
  readonly machine: string;
  readonly batch: number;
  readonly status: "optimal" | "feasible" | "infeasible" | "unknown";
  /** (best - bound) / best; 0 when optimal. */
  readonly gap: number;
  readonly flat: PlanFlat;
  readonly flatLength: number;
  /** Bends that several strokes make, evenly spread over the zone, with each stroke's own neutral length; absent when there are none. */
  readonly splits?: readonly { readonly bend: string; readonly hits: number; readonly allowance: number }[];
  readonly steps: readonly PlanStep[];
  /** The bend ids in order; several formed by one stroke are joined with "+". */
  readonly order: readonly string[];
  readonly stations: readonly PlanStation[];
  readonly seconds: { readonly setup: number; readonly perPart: number; readonly total: number };
  /** How often each time setting is paid; absent in plans of before it was kept, and where there are no steps. */
  readonly counts?: PlanCounts;
  readonly cost: number;
  readonly proof: { readonly method: string; readonly expanded: number; readonly bound: number };
  readonly alternatives?: readonly Omit<PlanDocument, "alternatives" | "flat" | "elapsedMs">[];
  readonly reasons: readonly PlanReason[];
  readonly cautions: readonly PlanReason[];
  /** What gauge and angles let every dimension miss; absent in plans of before it was kept, and where there are no steps. */
  readonly tolerances?: readonly PlanTolerance[];
  /** Where an order ends and all that stands in the way, when that was asked for and there is no plan. */
  readonly firstFailure?: PlanFailure;
  /** The least changes that would work, when they were asked for. */
  readonly changes?: readonly PlanChange[];
  /** How far the time settings may be off before another plan wins, when that was asked for. */
  readonly robustness?: PlanRobustness;
  readonly elapsedMs: number;
}

export interface PlanFlat {
  readonly width: number;
  readonly depth: number;
  readonly area: number;
  readonly massKg: number;
  readonly bends: readonly {
    readonly id: string;
    readonly allowance: number;
    readonly deduction: number;
    readonly k: number;
    readonly insideRadius: number;
    readonly source: string;
    /** The source as data, lengths in `units`; absent in plans of before it was kept. */
    readonly basis?: Plain<AllowanceBasis>;
  }[];
}

export interface PlanStep {
  readonly bends: readonly string[];
  /** Which stroke of how many it is, counted from the parent's side, where several make the bend; `angle` is this stroke's own. */
  readonly hit?: { readonly number: number; readonly of: number };
  /** The face next to the bend line on the operator's side. */
  readonly front: string;
  readonly punch: string;
  readonly die: string;
  readonly station: string;
  readonly bendZ: readonly [number, number];
  readonly angle: number;
  /** A hem takes two strokes: first to this angle (`demandedAngle` with its springback), then flat in the slot of the die. */
  readonly acuteAngle?: number;
  readonly demandedAngle: number;
  readonly insideRadius: number;
  readonly forceKN: number;
  readonly depthMm: number;
  readonly toolWindow: readonly [number, number];
  /** What the step needs of any bed, from the middle of its line: where punch and die may stand, and where the part lies; absent in plans of before it was kept, and where no solid run may stand over the line. */
  readonly room?: { readonly punch: readonly [number, number]; readonly die: readonly [number, number]; readonly sheet: readonly [number, number] };
  /** Where the middle of the load is, from the middle of the bed, and what the machine bears there, in kN; absent when its rating holds everywhere. */
  readonly offCentre?: { readonly z: number; readonly limitKN: number };
  readonly gauge: PlanGauge;
  readonly handling: { readonly flip: boolean; readonly turn: number };
}

export interface PlanGauge {
  readonly x: number;
  readonly r: number;
  readonly fingers: readonly { readonly x: number; readonly r: number; readonly z: number }[];
  readonly face: string;
  readonly edge: number;
  /** What the fingers touch: an edge of a level face, or the outside of an upright one; absent when nothing is touched. */
  readonly on?: "edge" | "face";
}

export interface PlanStation {
  readonly id: string;
  readonly punch: string;
  readonly die: string;
  readonly from: number;
  readonly to: number;
  readonly punchSections: readonly PlanSection[];
  readonly dieSections: readonly PlanSection[];
}

/** Left to right from the station's `from`; a gap between two is an entry of its own. */
export type PlanSection =
  | { readonly length: number; readonly piece?: string; readonly horn?: "left" | "right" | "both"; readonly gap?: never }
  | { readonly gap: number; readonly length?: never };

export type ReasonKind =
  | "clearance" | "self-collision" | "minimum-flange" | "no-punch" | "no-die" | "force" | "tool-force" | "sections" | "bed"
  | "daylight" | "gauge" | "angle" | "radius" | "lift" | "throat" | "hem" | "order" | "budget" | "part" | "whip-up" | "tool-choice" | "tolerance";

export interface PlanReason {
  readonly kind: ReasonKind;
  readonly bends: readonly string[];
  readonly faces: readonly string[];
  readonly tools: readonly string[];
  /** Says what is wrong and what would be right, in the part document's units. */
  readonly message: string;
  /** Where it happens, to draw it: stroke angle in degrees, depth of the overlap. */
  readonly evidence?: { readonly strokeAngle: number; readonly depth: number; readonly zFrom: number; readonly zTo: number };
}
