import type { Vec3 } from "./vec3";

/** `from`, moved `by` times `along`. */
export const moved = (from: Vec3, along: Vec3, by: number): Vec3 => [from[0] + along[0] * by, from[1] + along[1] * by, from[2] + along[2] * by];
