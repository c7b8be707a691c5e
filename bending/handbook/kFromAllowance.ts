import type { Mm, Rad } from "../core/units";

/** K = (BA / angle - r) / t: where the neutral line must lie, as a part of the thickness from the inside. */
export function kFromAllowance(allowance: Mm, angle: Rad, insideRadius: Mm, thickness: Mm): number {
  return (allowance / angle - insideRadius) / thickness;
}
