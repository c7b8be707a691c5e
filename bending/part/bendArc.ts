import type { Bend } from "./partModel";

/**
 * The cross-section of a bend formed to `angle`, in the plane across the bend line: u away from the parent
 * (0 at the tangent on the parent), z up through the thickness. The neutral line keeps its length, so its
 * radius is allowance / angle and the inside radius that minus k t. Flat (angle 0) is the limit, without a
 * division by 0.
 */
export interface BendArc {
  readonly angle: number;
  /** +1 when the child turns up (towards the base's top), -1 when it turns down. */
  readonly sense: 1 | -1;
  readonly allowance: number;
  /** Height of the neutral line over the sheet's bottom. */
  readonly neutralHeight: number;
}

export function bendArc(part: { readonly thickness: number }, bend: Bend, angle: number): BendArc {
  const up = bend.direction === "up";
  return {
    angle,
    sense: up ? 1 : -1,
    allowance: bend.allowance,
    neutralHeight: up ? part.thickness * (1 - bend.k) : part.thickness * bend.k,
  };
}
