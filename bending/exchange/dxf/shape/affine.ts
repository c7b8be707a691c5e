import type { Vec2 } from "../../../geometry/vec2";

/** x' = a x + c y + e, y' = b x + d y + f. */
export type Affine = readonly [a: number, b: number, c: number, d: number, e: number, f: number];

export const identityAffine: Affine = [1, 0, 0, 1, 0, 0];

export const applyAffine = (m: Affine, p: Vec2): Vec2 => [m[0] * p[0] + m[2] * p[1] + m[4], m[1] * p[0] + m[3] * p[1] + m[5]];

/** Of a direction: without the move. */
export const turnByAffine = (m: Affine, p: Vec2): Vec2 => [m[0] * p[0] + m[2] * p[1], m[1] * p[0] + m[3] * p[1]];

/** First `inner`, then `outer`. */
export function composeAffine(outer: Affine, inner: Affine): Affine {
  const [u, v, at] = [turnByAffine(outer, [inner[0], inner[1]]), turnByAffine(outer, [inner[2], inner[3]]), applyAffine(outer, [inner[4], inner[5]])];
  return [u[0], u[1], v[0], v[1], at[0], at[1]];
}

/** Whether circles stay circles under it. */
export function keepsCircles(m: Affine): boolean {
  const [u, v] = [Math.hypot(m[0], m[1]), Math.hypot(m[2], m[3])];
  return Math.abs(u - v) <= 1e-9 * Math.max(u, v) && Math.abs(m[0] * m[2] + m[1] * m[3]) <= 1e-9 * u * v;
}
