import type { Vec3 } from "./vec3";

/** The direction, of length 1; null when it has none. */
export function unitVector(v: Vec3): Vec3 | null {
  const length = Math.hypot(v[0], v[1], v[2]);
  return length > 1e-12 ? [v[0] / length, v[1] / length, v[2] / length] : null;
}
