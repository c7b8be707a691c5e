import { bulgeCentre } from "./bulgeCentre";
import type { Vec2 } from "../../../geometry/vec2";
import type { Piece } from "./piece";

/** The piece in two at the place nearest to the point, or null when that is farther than `tolerance` or at an end. */
export function splitPiece(piece: Piece, point: Vec2, tolerance: number): readonly [Piece, Piece] | null {
  const { from, to, bulge } = piece;
  const [dx, dy] = [to[0] - from[0], to[1] - from[1]];
  const length = Math.hypot(dx, dy);
  if (length <= 2 * tolerance) return null;
  if (bulge === 0) {
    const t = ((point[0] - from[0]) * dx + (point[1] - from[1]) * dy) / (length * length);
    if (t * length <= tolerance || (1 - t) * length <= tolerance) return null;
    const at: Vec2 = [from[0] + dx * t, from[1] + dy * t];
    return Math.hypot(at[0] - point[0], at[1] - point[1]) <= tolerance ? [{ ...piece, to: at }, { ...piece, from: at }] : null;
  }
  const { centre, radius } = bulgeCentre(from, to, bulge);
  const away = Math.hypot(point[0] - centre[0], point[1] - centre[1]);
  if (away === 0 || Math.abs(away - radius) > tolerance) return null;
  const turn = (p: Vec2, q: Vec2) => {
    const [ax, ay, bx, by] = [p[0] - centre[0], p[1] - centre[1], q[0] - centre[0], q[1] - centre[1]];
    const angle = Math.atan2(ax * by - ay * bx, ax * bx + ay * by) * Math.sign(bulge);
    return angle < 0 ? angle + 2 * Math.PI : angle;
  };
  const sweep = 4 * Math.atan(Math.abs(bulge));
  const first = turn(from, point);
  if (first * radius <= tolerance || first >= sweep || (sweep - first) * radius <= tolerance) return null;
  const at: Vec2 = [centre[0] + ((point[0] - centre[0]) * radius) / away, centre[1] + ((point[1] - centre[1]) * radius) / away];
  const part = (angle: number) => Math.tan(angle / 4) * Math.sign(bulge);
  return [{ ...piece, to: at, bulge: part(first) }, { ...piece, from: at, bulge: part(sweep - first) }];
}
