import { mm, rad, type Mm, type Rad } from "../core/units";

export interface BendState {
  readonly angle: Rad;
  readonly radius: Mm;
}

/**
 * What the tools have to make so that a bend springs back to `wanted`: r1 = kR (r2 + s / 2) - s / 2 and
 * alpha1 = alpha2 / kR, angles turned through (German metal-trades table book; formulas in part from memory).
 * For a small radius r1 may come out under 0: the table does not hold there.
 */
export function bendUnderLoad(wanted: BendState, thickness: Mm, factor: number): BendState {
  return { angle: rad(wanted.angle / factor), radius: mm(factor * (wanted.radius + thickness / 2) - thickness / 2) };
}
