import { mm, rad, toRad, deg, type Mm, type Rad } from "../core/units";
import { bendAllowance } from "./bendAllowance";

/** Degrees a hit that leave a face that looks smooth (MetalForming Magazine). */
export const SMOOTH_STEP = toRad(deg(2));

export interface SteppedRadius {
  readonly hits: number;
  readonly anglePerHit: Rad;
  readonly insideArc: Mm;
  readonly neutralArc: Mm;
  /** Distance of two hits on the flat sheet, along the neutral line. */
  readonly pitch: Mm;
  /** How far the middle of a flat facet stands inside the true arc: R (1 - cos(half a step)). */
  readonly facetHeight: Mm;
  /** V of about twice the pitch. */
  readonly vOpening: Mm;
}

/** Step wanted: an angle a hit, or a pitch along the inside arc. */
export type StepWish = { readonly angle: Rad } | { readonly insidePitch: Mm };

/** Hits are whole: a wish met but for rounding noise asks for no further hit. */
const NOISE = 1e-9;

/**
 * A large radius by many small bends: n = total angle / angle a hit, or arc / pitch, made whole upwards; pitch on the flat
 * = angle / n x (R + k t); die opening about twice the pitch (MetalForming Magazine).
 */
export function radiusBySteps(angle: Rad, insideRadius: Mm, thickness: Mm, k: number, wish: StepWish = { angle: SMOOTH_STEP }): SteppedRadius {
  const insideArc = mm(angle * insideRadius);
  const steps = "angle" in wish ? angle / wish.angle : insideArc / wish.insidePitch;
  const hits = Math.max(1, Math.ceil(steps - NOISE));
  const anglePerHit = rad(angle / hits);
  const pitch = bendAllowance(anglePerHit, insideRadius, k, thickness);
  return {
    hits,
    anglePerHit,
    insideArc,
    neutralArc: bendAllowance(angle, insideRadius, k, thickness),
    pitch,
    facetHeight: mm(insideRadius * (1 - Math.cos(anglePerHit / 2))),
    vOpening: mm(2 * pitch),
  };
}
