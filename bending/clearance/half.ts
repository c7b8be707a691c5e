import type { Mm } from "../core/units";
import type { Frame } from "../geometry/frame";
import type { Interval } from "../geometry/interval";
import type { Bend } from "../part/partModel";
import type { FacePath } from "./facePath";
import type { Meeting } from "./meeting";
import type { Plates } from "./plates";

/** Least and greatest of a wing's coordinates (see `Prism`). */
export interface Bounds {
  readonly a: readonly [number, number];
  readonly b: readonly [number, number];
  readonly z: readonly [number, number];
}

/** A face with the bend zone on its near side, in one state of the bends between it and the hit. */
export interface FaceState {
  readonly path: FacePath;
  /** Bits of the path's bends that are formed. */
  readonly state: number;
  /** The face before it on the path; null for a wing. */
  readonly before: FaceState | null;
  /** Numbered within its half from 0. */
  readonly index: number;
  /** From the unfolded sheet to the wing's coordinates, which are the machine's before the stroke but for where x is counted from. */
  readonly frame: () => Frame;
  readonly bounds: () => Bounds;
  readonly plates: () => Plates;
  /** What was answered about it, by the question's number. */
  readonly meetings: (Meeting | undefined)[];
}

/** The faces of a half up to and with one of them, in one state: what the first few bends decide is shared by all states that agree on them. */
export interface HalfState {
  /** The faces before this one; null for the first. */
  readonly before: HalfState | null;
  readonly last: FaceState;
  /** Numbered within its half from 0. */
  readonly index: number;
  /** What was answered about it, by the question's number. */
  readonly answers: (HalfAnswer | undefined)[];
}

/** Where a question's thing must not stand because of one half. */
export interface HalfAnswer {
  /** z of the half's own placement at the back; sorted, apart. */
  readonly back: readonly Interval[];
  /** The same when the half is in front: turned about the middle. */
  readonly front: readonly Interval[];
}

/**
 * The part on one side of a hit, always placed at the back of the machine. In front it stands turned by half a turn about
 * the vertical, so it meets there what it would meet at the back of a thing turned likewise.
 */
export interface Half {
  readonly bend: Bend;
  readonly thickness: Mm;
  /** Near faces first; every face but a wing adds one bend. */
  readonly paths: readonly FacePath[];
  /** All bends that decide how the half stands. */
  readonly mask: number;
  /** The hit's bend lines at the back, from the middle of the hit. */
  readonly lines: readonly Interval[];
  /** The whole half in a state. */
  readonly at: (formed: number) => HalfState;
  /** The next free number for a question. */
  readonly nextQuestion: () => number;
}
