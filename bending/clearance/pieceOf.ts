import type { Vec2 } from "../geometry/vec2";
import type { ConvexPiece, PieceRole } from "./convexPiece";
import { FARTHEST_CORNER, halfPlanes } from "./halfPlanes";

/** A convex counter-clockwise polygon as a piece; `skin`: how far each side moves out (in, below 0) for meant contact. */
export function pieceOf(role: PieceRole, corners: readonly Vec2[], margin: number, skin: (side: number) => number): ConvexPiece {
  const out = margin * FARTHEST_CORNER;
  const [x, y] = [corners.map((p) => p[0]), corners.map((p) => p[1])];
  return {
    role,
    corners,
    withMargin: halfPlanes(corners, () => margin),
    withoutSkin: halfPlanes(corners, skin),
    box: [Math.min(...x) - out, Math.max(...x) + out, Math.min(...y) - out, Math.max(...y) + out],
  };
}
