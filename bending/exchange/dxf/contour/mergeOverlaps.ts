import { DRAWN_POINT_MM } from "../../../core/tolerance";
import type { Vec2 } from "../../../geometry/vec2";
import type { Piece, Repair } from "./piece";
import { placeText } from "./placeText";

/** Lines are on one line when neither end stands farther off it than this. */
const OFF_MM = 2 * DRAWN_POINT_MM;

interface Along { readonly piece: Piece; readonly angle: number; readonly offset: number; from: number; to: number }

/** Straight pieces that lie on one line and run over one another become one piece. Pieces that only meet end to end stay. */
export function mergeOverlaps(pieces: readonly Piece[]): { readonly pieces: readonly Piece[]; readonly repairs: readonly Repair[] } {
  const repairs: Repair[] = [];
  const kept: Piece[] = pieces.filter(({ bulge }) => bulge !== 0);
  const buckets = new Map<string, Along[]>();
  for (const piece of pieces) {
    if (piece.bulge !== 0) continue;
    const line = along(piece);
    // Neighbouring buckets overlap in what they hold: a line goes to the bucket of its rounded angle and offset only; twins by a
    // hair's breadth in two buckets stay apart, which is no more than a repair that is not made.
    const key = `${Math.round(line.angle * 2000)},${Math.round(line.offset * 20)}`;
    const list = buckets.get(key);
    if (list) list.push(line);
    else buckets.set(key, [line]);
  }
  for (const lines of buckets.values()) {
    lines.sort((a, b) => a.from - b.from);
    let current: Along | null = null;
    for (const line of lines) {
      if (current && line.from < current.to - OFF_MM && onOneLine(current.piece, line.piece)) {
        const at: Vec2 = pointAt(current, (Math.max(current.from, line.from) + Math.min(current.to, line.to)) / 2);
        repairs.push({ kind: "overlap", at, message: `two lines that run over one another at ${placeText(at)} were made one` });
        current.to = Math.max(current.to, line.to);
        continue;
      }
      if (current) kept.push(pieceOf(current));
      current = line;
    }
    if (current) kept.push(pieceOf(current));
  }
  return { pieces: repairs.length === 0 ? pieces : kept, repairs };
}

function along(piece: Piece): Along {
  const [dx, dy] = [piece.to[0] - piece.from[0], piece.to[1] - piece.from[1]];
  const turned = Math.atan2(dy, dx);
  // Half a turn and none are the same line.
  const angle = turned < -1e-4 ? turned + Math.PI : turned > Math.PI - 1e-4 ? turned - Math.PI : turned;
  const [ux, uy] = [Math.cos(angle), Math.sin(angle)];
  const on = (p: Vec2) => p[0] * ux + p[1] * uy;
  const [a, b] = [on(piece.from), on(piece.to)];
  return { piece, angle, offset: piece.from[1] * ux - piece.from[0] * uy, from: Math.min(a, b), to: Math.max(a, b) };
}

function onOneLine(a: Piece, b: Piece): boolean {
  const length = Math.hypot(a.to[0] - a.from[0], a.to[1] - a.from[1]);
  const off = (p: Vec2) => Math.abs((a.to[0] - a.from[0]) * (p[1] - a.from[1]) - (a.to[1] - a.from[1]) * (p[0] - a.from[0])) / length;
  return off(b.from) <= OFF_MM && off(b.to) <= OFF_MM;
}

const pointAt = ({ angle, offset }: Along, s: number): Vec2 => [s * Math.cos(angle) - offset * Math.sin(angle), s * Math.sin(angle) + offset * Math.cos(angle)];

/** The piece itself where it was not made longer, so that its ends keep their digits. */
function pieceOf(line: Along): Piece {
  const own = along(line.piece);
  return own.from === line.from && own.to === line.to ? line.piece : { ...line.piece, from: pointAt(line, line.from), to: pointAt(line, line.to) };
}
