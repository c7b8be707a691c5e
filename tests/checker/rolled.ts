import type { Bend } from "@/bending";
import type { Placing, Point } from "./placing";

/** The sheet across one bend: where the bent strip begins on the parent, and the directions along and across. */
export interface Strip {
  readonly along: readonly [number, number];
  readonly across: readonly [number, number];
  readonly begin: number;
  /** +1 when the child turns to the sheet's top. */
  readonly way: 1 | -1;
}

const strips = new WeakMap<Bend, Strip>();

export function stripOf(bend: Bend): Strip {
  const known = strips.get(bend);
  if (known) return known;
  const [[ax, ay], [bx, by]] = bend.line;
  const length = Math.hypot(bx - ax, by - ay);
  const along: readonly [number, number] = [(bx - ax) / length, (by - ay) / length];
  const across: readonly [number, number] = [along[1], -along[0]];
  const made: Strip = { along, across, begin: ax * across[0] + ay * across[1] - bend.allowance / 2, way: bend.direction === "up" ? 1 : -1 };
  strips.set(bend, made);
  return made;
}

/** Height of the sheet's axis of bending over the sheet's bottom: over it (up) or under it (down). */
const axisHeight = (bend: Bend, thickness: number, angle: number, way: number): number =>
  (way > 0 ? thickness * (1 - bend.k) : thickness * bend.k) + (way * bend.allowance) / angle;

/** The child's sheet rolled about the axis of the bend: it slides back by the bent strip and turns by the angle. */
export function rolled(bend: Bend, thickness: number, angle: number): Placing {
  const { along: [dx, dy], across: [nx, ny], begin, way } = stripOf(bend);
  if (angle === 0) return [1, 0, 0, 0, 0, 1, 0, 0, 0, 0, 1, 0];
  const height = axisHeight(bend, thickness, angle, way);
  const [c, s] = [Math.cos(angle), way * Math.sin(angle)];
  const out = begin - (bend.allowance + begin) * c + height * s;
  const up = height - (bend.allowance + begin) * s - height * c;
  return [
    dx * dx + nx * nx * c, dx * dy + nx * ny * c, -nx * s, nx * out,
    dy * dx + ny * nx * c, dy * dy + ny * ny * c, -ny * s, ny * out,
    s * nx, s * ny, c, up,
  ];
}

/** A point of the strip (`share` of the way from the parent, `along` the line, `z` over the bottom), bent, as it lies to the parent. */
export function inStrip(bend: Bend, thickness: number, angle: number, share: number, along: number, z: number): Point {
  const { along: [dx, dy], across: [nx, ny], begin, way } = stripOf(bend);
  let out = begin + share * bend.allowance;
  let up = z;
  if (angle !== 0) {
    const height = axisHeight(bend, thickness, angle, way);
    out = begin - (z - height) * way * Math.sin(angle * share);
    up = height + (z - height) * Math.cos(angle * share);
  }
  return [dx * along + nx * out, dy * along + ny * out, up];
}
