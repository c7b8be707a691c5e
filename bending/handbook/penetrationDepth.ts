import { mm, type Mm, type Rad } from "../core/units";

interface DieFacts {
  /** Between the tops of the shoulder arcs. */
  readonly vOpening: Mm;
  readonly shoulderRadius: Mm;
}

/**
 * How far the punch has travelled from the flat sheet when the sheet has the inside radius `insideRadius` and is
 * turned through `angle` under load: D = c tan(a / 2) - (R + t + rd) (1 / cos(a / 2) - 1), c = V / 2.
 * Derived from an outside arc with straight wings tangent to it and to the die's shoulder arcs, and checked by
 * sampling the curves; no springback, no stretch of the machine, punch nose not larger than R. The trade's
 * plain form (V / 2) tan(a / 2) leaves the radii out.
 */
export function penetrationDepth(angle: Rad, insideRadius: Mm, thickness: Mm, { vOpening, shoulderRadius }: DieFacts): Mm {
  const slope = angle / 2;
  return mm((vOpening / 2) * Math.tan(slope) - (insideRadius + thickness + shoulderRadius) * (1 / Math.cos(slope) - 1));
}
