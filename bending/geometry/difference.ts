import type { Vec3 } from "./vec3";

/** From b to a. */
export const difference = (a: Vec3, b: Vec3): Vec3 => [a[0] - b[0], a[1] - b[1], a[2] - b[2]];
