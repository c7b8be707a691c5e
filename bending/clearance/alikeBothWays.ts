import { SAME_POINT_MM } from "../core/tolerance";
import type { Vec2 } from "../geometry/vec2";

/** Is a profile its own mirror image in x = 0? Every side must be there the other way round. */
export function alikeBothWays(profile: readonly Vec2[]): boolean {
  const near = (p: Vec2, q: Vec2) => Math.abs(p[0] + q[0]) < SAME_POINT_MM && Math.abs(p[1] - q[1]) < SAME_POINT_MM;
  const next = (i: number) => profile[(i + 1) % profile.length] as Vec2;
  return profile.every((p, i) => profile.some((q, j) => near(p, next(j)) && near(next(i), q)));
}
