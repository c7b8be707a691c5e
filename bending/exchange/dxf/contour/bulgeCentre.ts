import type { Vec2 } from "../../../geometry/vec2";

/** Centre and radius of a bulged edge (bulge not 0): the centre stands off the chord's middle by half the chord / tan(half the angle), to its left when positive. */
export function bulgeCentre(from: Vec2, to: Vec2, bulge: number): { readonly centre: Vec2; readonly radius: number } {
  const [dx, dy] = [to[0] - from[0], to[1] - from[1]];
  const toCentre = (1 - bulge * bulge) / (4 * bulge);
  const centre: Vec2 = [(from[0] + to[0]) / 2 - dy * toCentre, (from[1] + to[1]) / 2 + dx * toCentre];
  return { centre, radius: (Math.hypot(dx, dy) * (1 + bulge * bulge)) / (4 * Math.abs(bulge)) };
}
