import { DRAWN_POINT_MM } from "../../../core/tolerance";
import type { Vec2 } from "../../../geometry/vec2";
import { createPointGrid } from "./createPointGrid";
import type { Piece, Repair } from "./piece";
import { pieceMiddle } from "./pieceMiddle";
import { placeText } from "./placeText";

const near = (p: Vec2, q: Vec2) => Math.hypot(p[0] - q[0], p[1] - q[1]) <= 2 * DRAWN_POINT_MM;

/** Takes out pieces without length and pieces drawn more than once. */
export function removeRepeats(pieces: readonly Piece[]): { readonly pieces: readonly Piece[]; readonly repairs: readonly Repair[] } {
  const repairs: Repair[] = [];
  const kept: Piece[] = [];
  const middles = createPointGrid(1);
  for (const piece of pieces) {
    const middle = pieceMiddle(piece);
    if (Math.hypot(piece.to[0] - piece.from[0], piece.to[1] - piece.from[1]) <= DRAWN_POINT_MM) {
      repairs.push({ kind: "no length", at: middle, message: `a line without length at ${placeText(middle)} was taken out` });
      continue;
    }
    const twin = middles.near(middle, 2 * DRAWN_POINT_MM).some((id) => {
      const other = kept[id];
      return other && ((near(other.from, piece.from) && near(other.to, piece.to)) || (near(other.from, piece.to) && near(other.to, piece.from)));
    });
    if (twin) {
      repairs.push({ kind: "drawn twice", at: middle, message: `a line drawn twice at ${placeText(middle)} was taken out once` });
      continue;
    }
    middles.add(middle, kept.length);
    kept.push(piece);
  }
  return { pieces: kept, repairs };
}
