import type { Mm, Rad } from "../core/units";
import type { Interval } from "../geometry/interval";
import type { Die, Punch, Tool } from "../tooling/tool";
import type { Hit } from "./hit";

/** What a part meets in a stroke, with what is needed to draw and to say it. */
export interface ClearanceHit {
  readonly kind: "punch" | "die" | "ram" | "bed" | "self" | "trapped";
  /** Index of the face (a bend zone counts with the face on its far side from the hit). */
  readonly face: number;
  /** The other face when the part meets itself. */
  readonly otherFace: number | null;
  /** Id of the tool, null for ram, bed and the part itself. */
  readonly tool: string | null;
  /** Angle turned through at which it is met first. */
  readonly strokeAngle: Rad;
  /** How far the part is in, the margin included. */
  readonly depth: Mm;
  /** From the middle of the hit. */
  readonly z: Interval;
  /** The bends that decide it: every state that agrees with `value` on `mask` meets the same (bit masks over bend indices). */
  readonly mask: number;
  readonly value: number;
  /** For `trapped`: what would let the part on or off. */
  readonly need: string | null;
}

/** Where a tool must not stand because of one face, z from the hit's middle, and the bends that decide it. */
export interface StrokeMeeting {
  readonly intervals: readonly Interval[];
  readonly mask: number;
  readonly value: number;
}

/** Answers every clearance question about one part on one machine; remembers what it has worked out. */
export interface Clearance {
  /** z-intervals from the hit's middle in which `obstacle` must not stand while this hit is made with this punch and die: sorted, apart. */
  forbidden(hit: Hit, punch: Punch, die: Die, obstacle: Tool): readonly Interval[];
  /** The same question, answered with what is met (one entry for each face that is met). */
  evidence(hit: Hit, punch: Punch, die: Die, obstacle: Tool): readonly ClearanceHit[];
  /**
   * A part of the answer, for reasons that hold elsewhere too: what the obstacle meets during the stroke itself. Every state that agrees
   * with `value` on `mask` has these intervals forbidden at least. Nothing is told of hems.
   */
  inStroke(hit: Hit, punch: Punch, die: Die, obstacle: Tool): readonly StrokeMeeting[];
  /** What no place on the bed and no length of tool helps: ram, bed, the part meeting itself, no way on or off. */
  blocked(hit: Hit, punch: Punch, die: Die): readonly ClearanceHit[];
  /** The same asked in turn, ended by the first kind of thing that blocks; empty when nothing does. */
  firstBlock(hit: Hit, punch: Punch, die: Die): readonly ClearanceHit[];
  /** How much was worked out so far. */
  counts(): { readonly clips: number; readonly entries: number };
}

export interface ClearanceOptions {
  /** mm between part and tools; the machine's setting when absent. */
  readonly margin?: Mm;
  /** The angle that the stroke goes to (springback included); the bend's own angle when absent. */
  readonly demandedAngle?: (bend: number, die: Die) => Rad;
}
