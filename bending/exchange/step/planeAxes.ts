import { crossProduct } from "../../geometry/crossProduct";
import type { Frame } from "../../geometry/frame";
import { unitVector } from "../../geometry/unitVector";
import type { Vec3 } from "../../geometry/vec3";

/** A frame with z along `normal`, its x along `along` as far as that lies in the plane, else along the nearest axis. */
export function planeAxes(normal: Vec3, o: Vec3, along?: Vec3): Frame {
  const least = normal.reduce((best, value, i) => (Math.abs(value) < Math.abs(normal[best] ?? 0) ? i : best), 0);
  const wish: Vec3 = along ?? [least === 0 ? 1 : 0, least === 1 ? 1 : 0, least === 2 ? 1 : 0];
  const y = unitVector(crossProduct(normal, wish)) ?? [0, 1, 0];
  return { x: crossProduct(y, normal), y, z: normal, o };
}
