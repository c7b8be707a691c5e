import type { Vec2 } from "../geometry/vec2";

/** Widest turn of an offset corner, radians: it reaches at most 1 / cos(turn / 2) = 1.08 times the offset from the solid. */
const WIDEST_TURN = Math.PI / 4;

/** How many times the offset a corner reaches out at the most. */
export const FARTHEST_CORNER = 1 / Math.cos(WIDEST_TURN / 2);

/**
 * The half-planes of a convex counter-clockwise polygon (nx, ny, c a piece; inside nx x + ny y <= c), each side moved out by
 * its own offset (negative: in). Corners that turn sharply get further half-planes, so that no corner reaches far out.
 */
export function halfPlanes(corners: readonly Vec2[], offset: (side: number) => number): Float64Array {
  const planes: number[] = [];
  const n = corners.length;
  const sides = corners.map((p, i) => {
    const q = corners[(i + 1) % n] ?? p;
    return { p, length: Math.hypot(q[0] - p[0], q[1] - p[1]), turn: Math.atan2(p[0] - q[0], q[1] - p[1]), by: offset(i) };
  }).filter((side) => side.length > 1e-9);
  sides.forEach((side, i) => {
    const add = (turn: number, by: number) => {
      const [nx, ny] = [Math.cos(turn), Math.sin(turn)];
      planes.push(nx, ny, nx * side.p[0] + ny * side.p[1] + by);
    };
    const before = sides[(i + sides.length - 1) % sides.length] ?? side;
    let corner = side.turn - before.turn;
    while (corner < 0) corner += 2 * Math.PI;
    const by = Math.max(side.by, before.by);
    const steps = by > 0 ? Math.ceil(corner / WIDEST_TURN) : 1;
    for (let k = 1; k < steps; k++) add(before.turn + (corner * k) / steps, by);
    add(side.turn, side.by);
  });
  return Float64Array.from(planes);
}
