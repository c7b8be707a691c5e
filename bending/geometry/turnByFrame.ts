import type { Frame } from "./frame";
import type { Vec3 } from "./vec3";

/** Turns a direction by the frame, without moving it. */
export function turnByFrame(frame: Frame, v: Vec3): Vec3 {
  const { x, y, z } = frame;
  return [
    x[0] * v[0] + y[0] * v[1] + z[0] * v[2],
    x[1] * v[0] + y[1] * v[1] + z[1] * v[2],
    x[2] * v[0] + y[2] * v[1] + z[2] * v[2],
  ];
}
