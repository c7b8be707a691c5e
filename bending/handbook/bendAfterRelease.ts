import { mm, rad, type Mm } from "../core/units";
import type { BendState } from "./bendUnderLoad";

/** The reverse of `bendUnderLoad`: r2 = (r1 + s / 2) / kR - s / 2, alpha2 = alpha1 kR (the same table book, turned round). */
export function bendAfterRelease(made: BendState, thickness: Mm, factor: number): BendState {
  return { angle: rad(made.angle * factor), radius: mm((made.radius + thickness / 2) / factor - thickness / 2) };
}
