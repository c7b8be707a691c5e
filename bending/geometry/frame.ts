import type { Vec3 } from "./vec3";

/** A rigid placement: p -> o + x * p[0] + y * p[1] + z * p[2], with x, y, z at right angles and of length 1. */
export interface Frame {
  readonly x: Vec3;
  readonly y: Vec3;
  readonly z: Vec3;
  readonly o: Vec3;
}
