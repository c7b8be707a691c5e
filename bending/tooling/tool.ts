import type { KiloNewtonPerMetre, Mm, Rad } from "../core/units";
import type { ProfilePoint } from "../geometry/vec2";

/**
 * A tool as the shop knows it, in millimetres and radians.
 * Punch profile: tip at the origin, body upwards. Die profile: V centre of the top plane at the origin, body
 * downwards. x towards the back of the machine, y up; closed implicitly, not self-crossing, counter-clockwise.
 */
export type Tool = Punch | Die;

export interface ToolCommon {
  readonly id: string;
  readonly name: string;
  readonly profile: readonly ProfilePoint[];
  /** Working height: seat to tip (punch), seat to top plane (die). */
  readonly height: Mm;
  readonly maxForcePerMetre: KiloNewtonPerMetre;
  readonly tang: string;
  /** The pieces in service, longest first; each entry is one physical piece. */
  readonly pieces: readonly ToolPiece[];
}

export interface Punch extends ToolCommon {
  readonly kind: "punch";
  readonly tipAngle: Rad;
  readonly tipRadius: Mm;
}

export interface Die extends ToolCommon {
  readonly kind: "die";
  /** Between the tops of the shoulder arcs. */
  readonly vOpening: Mm;
  readonly vAngle: Rad;
  readonly shoulderRadius: Mm;
  /** The slot of a two-stage hem die; absent on every other die. */
  readonly flattening?: FlatteningSlot;
}

/** Where a two-stage hem die flattens: a slot in its front that the stroke closes, with the fold against its end. */
export interface FlatteningSlot {
  /** From the top plane down to the face that the sheet lies on. */
  readonly floor: Mm;
  /** Where the fold stops: x from the middle of the V, below 0 in front of it. */
  readonly back: Mm;
  /** Clear height while it stands open. */
  readonly opening: Mm;
}

export interface ToolPiece {
  /** The shop's mark on the piece; made up from tool, length and count when a document gives none. */
  readonly id: string;
  readonly length: Mm;
  /** Which end is cut away, seen by the operator. */
  readonly horn: "left" | "right" | "both" | null;
  /** Rack place, when known. */
  readonly rack: string | null;
}
