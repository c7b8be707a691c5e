import type { Frame } from "../../geometry/frame";
import type { Vec2 } from "../../geometry/vec2";
import type { BendDirection, DocumentHole } from "../../part/partDocument";

/** A sheet-metal part found in a solid: plane plates joined by bends, millimetres and radians. Plate 0 is the base, a parent stands before its children, and `bends[i]` carries `plates[i + 1]`. */
export interface RecognisedPart {
  readonly thickness: number;
  readonly plates: readonly RecognisedPlate[];
  readonly bends: readonly RecognisedBend[];
  /** Of each face of the solid. */
  readonly roles: readonly FaceRole[];
  /** What is in the solid and not in the plates and bends. */
  readonly leftOut: readonly LeftOut[];
  /** What was taken a little differently from how it is drawn. */
  readonly notes: readonly string[];
  /** mm³: of the solid, and of plates and bends together. */
  readonly solidVolume: number;
  readonly volume: number;
}

export type FaceRole = "sheet" | "bend" | "edge" | "left out";

export interface RecognisedPlate {
  /** Faces of the solid: on the side of the base's top, and the other. */
  readonly faces: readonly [number, number];
  /** From the plate's own coordinates to the solid's: z towards the base's top, 0 at the underside. A child's x runs along its bend, which lies at y = 0 with the plate below. */
  readonly frame: Frame;
  /** Counter-clockwise. */
  readonly outline: readonly OutlineVertex[];
  readonly holes: readonly DocumentHole[];
}

/** x, y and the bulge of the edge that starts here. */
export type OutlineVertex = readonly [number, number, number];

export interface RecognisedBend {
  readonly parent: number;
  readonly child: number;
  /** Turned through. */
  readonly angle: number;
  readonly direction: BendDirection;
  readonly insideRadius: number;
  /** Which edge of the parent's outline it is on. */
  readonly parentEdge: number;
  /** Which edge of the child's outline lies on it. */
  readonly childEdge: number;
  /** Where the bend begins along the parent's edge, from the edge's start, and how long it is. */
  readonly start: number;
  readonly length: number;
  /** Faces of the solid. */
  readonly faces: readonly number[];
  /** Cut-outs that run across the bend, that reach into it from one plate, or that lie wholly inside it. */
  readonly windows: readonly BendWindow[];
}

/** The rim of a cut-out in a bend, its pieces end to end, closed, the material on the left. */
export interface BendWindow {
  readonly pieces: readonly WindowPiece[];
}

/**
 * On a plate: the rim in the plate's coordinates, its ends on the bend. In the bend: points at (mm along the bend from its start, part of the
 * bend's angle from the parent, 0 to 1), without those that lie on a plate's rim.
 */
export type WindowPiece =
  | { readonly on: "parent" | "child"; readonly rim: readonly OutlineVertex[] }
  | { readonly on: "bend"; readonly path: readonly Vec2[] };

/** Faces of the solid that belong together and are no plate, bend or edge of one. */
export interface LeftOut {
  readonly faces: readonly number[];
  readonly message: string;
}
