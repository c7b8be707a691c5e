import type { Vec2 } from "../../../geometry/vec2";
import type { Piece } from "./piece";

/** The point half way along a piece: half the chord times the bulge off the chord, on its right when the bulge is positive. */
export function pieceMiddle({ from, to, bulge }: Pick<Piece, "from" | "to" | "bulge">): Vec2 {
  return [(from[0] + to[0]) / 2 + ((to[1] - from[1]) * bulge) / 2, (from[1] + to[1]) / 2 - ((to[0] - from[0]) * bulge) / 2];
}
