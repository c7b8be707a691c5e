import type { Frame } from "./frame";
import type { Vec3 } from "./vec3";

/** The frame that undoes `frame`; right for rigid frames only (the inverse of a rotation is its transpose). */
export function invertFrame({ x, y, z, o }: Frame): Frame {
  const back = (axis: Vec3) => -(axis[0] * o[0] + axis[1] * o[1] + axis[2] * o[2]);
  return {
    x: [x[0], y[0], z[0]],
    y: [x[1], y[1], z[1]],
    z: [x[2], y[2], z[2]],
    o: [back(x), back(y), back(z)],
  };
}
