import type { Mm } from "../core/units";
import type { Frame } from "../geometry/frame";
import type { Vec3 } from "../geometry/vec3";
import type { Bend } from "../part/partModel";

/**
 * Frame of the child in its parent, both in coordinates of the unfolded sheet, when the bend is formed to `angle`
 * (0 = flat). The zone keeps its neutral length: neutral radius = allowance / angle, centre on the side that it turns to.
 */
export function bendTurn(bend: Bend, thickness: Mm, angle: number): Frame {
  const [[ax, ay], [bx, by]] = bend.line;
  const length = Math.hypot(bx - ax, by - ay);
  const u: Vec3 = [(bx - ax) / length, (by - ay) / length, 0];
  const n: Vec3 = [u[1], -u[0], 0];
  const sign = bend.direction === "up" ? 1 : -1;
  const neutralZ = bend.direction === "up" ? thickness * (1 - bend.k) : thickness * bend.k;
  const [c, s] = [Math.cos(angle), sign * Math.sin(angle)];
  const radius = angle < 1e-9 ? 0 : bend.allowance / angle;
  const along = angle < 1e-9 ? bend.allowance : radius * Math.sin(angle);
  const up = sign * radius * (1 - Math.cos(angle));
  const toLine = n[0] * ax + n[1] * ay;
  const half = bend.allowance / 2;
  const start = -toLine - half;
  const a = toLine - half + along + start * c + s * neutralZ;
  const z = neutralZ + up + start * s - c * neutralZ;
  const turned: Vec3 = [n[0] * c, n[1] * c, s];
  return {
    x: [u[0] * u[0] + n[0] * turned[0], u[0] * u[1] + n[0] * turned[1], n[0] * turned[2]],
    y: [u[1] * u[0] + n[1] * turned[0], u[1] * u[1] + n[1] * turned[1], n[1] * turned[2]],
    z: [-s * n[0], -s * n[1], c],
    o: [n[0] * a, n[1] * a, z],
  };
}
