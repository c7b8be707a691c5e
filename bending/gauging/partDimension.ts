import type { Vec3 } from "../geometry/vec3";

/**
 * A size of the finished part. `leg`: within one face, from the outside of a bend to the opposite bend's outside or to the
 * far edge, as part documents state lengths (apex of the outside surfaces up to 90 degrees, outermost tangent above).
 * `hole`: from a bend's outside to the middle of the nearest round hole of the face. `overall`: over the whole folded part.
 */
export interface PartDimension {
  readonly kind: "leg" | "hole" | "overall";
  /** The face in whose plane, or from whose plane, it is measured. */
  readonly face: number;
  /** Unit direction from `from` to `to`, in the unfolded sheet as that face lies in it. */
  readonly direction: Vec3;
  /** Where it may begin and end: all are equally far on the drawing, the worst pair on the real part counts. */
  readonly from: readonly DimensionEnd[];
  readonly to: readonly DimensionEnd[];
}

export type DimensionEnd =
  /** A point of a face, in the unfolded sheet, z from 0 to the thickness. */
  | { readonly at: "point"; readonly face: number; readonly point: Vec3; readonly name: string }
  /** The outside of a bend, measured in the plane of the face that is named: apex or outermost tangent. */
  | { readonly at: "outside"; readonly face: number; readonly bend: number }
  /** The outside of a bend's arc, where it stands out farthest in the direction. */
  | { readonly at: "arc"; readonly bend: number };
