import type { Frame } from "./frame";
import type { Vec3 } from "./vec3";

/** The point `p` of the frame's own coordinates, in the coordinates that the frame stands in. */
export function applyFrame(frame: Frame, p: Vec3): Vec3 {
  const { x, y, z, o } = frame;
  return [
    o[0] + x[0] * p[0] + y[0] * p[1] + z[0] * p[2],
    o[1] + x[1] * p[0] + y[1] * p[1] + z[1] * p[2],
    o[2] + x[2] * p[0] + y[2] * p[1] + z[2] * p[2],
  ];
}
