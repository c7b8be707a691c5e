import type { Frame } from "../geometry/frame";
import type { Vec3 } from "../geometry/vec3";
import { bendArc } from "./bendArc";
import { bendDirections } from "./bendDirections";
import type { Bend, PartModel } from "./partModel";
import { pointOnBendArc } from "./pointOnBendArc";

/**
 * How one bend, formed to `angle` radians, moves the child: from coordinates of the unfolded sheet to
 * coordinates of the sheet as it lies with the parent, still at rest. Angle 0 moves nothing.
 */
export function bendFrame(part: PartModel, bend: Bend, angle: number): Frame {
  const { along: d, outward: n } = bendDirections(bend);
  const arc = bendArc(part, bend, angle);
  const cos = Math.cos(angle);
  const sin = arc.sense * Math.sin(angle);
  // Where the child's tangent goes, on the neutral line.
  const [u, z] = pointOnBendArc(arc, 1, 0);
  const from = bend.zone[1];
  const start = bend.zone[0];
  const to: Vec3 = [start[0] + n[0] * u, start[1] + n[1] * u, z];
  const turn = (out: number, along: number, up: number): Vec3 => {
    const across = out * cos - up * sin;
    return [d[0] * along + n[0] * across, d[1] * along + n[1] * across, out * sin + up * cos];
  };
  const x = turn(n[0], d[0], 0);
  const y = turn(n[1], d[1], 0);
  const zAxis = turn(0, 0, 1);
  // `from` may lie shifted along the line against `start` when the zone is not a rectangle.
  const shift = (from[0] - start[0]) * d[0] + (from[1] - start[1]) * d[1];
  const target: Vec3 = [to[0] + d[0] * shift, to[1] + d[1] * shift, to[2]];
  const moved = (i: 0 | 1 | 2) => x[i] * from[0] + y[i] * from[1] + zAxis[i] * arc.neutralHeight;
  return { x, y, z: zAxis, o: [target[0] - moved(0), target[1] - moved(1), target[2] - moved(2)] };
}
