import type { Vec3 } from "./vec3";

export const dotProduct = (a: Vec3, b: Vec3): number => a[0] * b[0] + a[1] * b[1] + a[2] * b[2];
