import type { Vec2 } from "../geometry/vec2";
import { clipByHalfPlane } from "../geometry/clipByHalfPlane";
import type { ConvexPiece, Outline, PieceRole } from "./convexPiece";
import { FARTHEST_CORNER, halfPlanes } from "./halfPlanes";

/** A convex counter-clockwise polygon as a piece; `skin`: how far each side moves out (in, below 0) for meant contact. */
export function pieceOf(role: PieceRole, corners: readonly Vec2[], margin: number, skin: (side: number) => number): ConvexPiece {
  const out = margin * FARTHEST_CORNER;
  const [x, y] = [corners.map((p) => p[0]), corners.map((p) => p[1])];
  return {
    role,
    corners,
    withMargin: outlineOf(corners, halfPlanes(corners, () => margin), out),
    withoutSkin: outlineOf(corners, halfPlanes(corners, skin), out),
    box: [Math.min(...x) - out, Math.max(...x) + out, Math.min(...y) - out, Math.max(...y) + out],
  };
}

/** The corners of what half-planes leave; nothing of it lies farther than `out` off the polygon. */
function outlineOf(polygon: readonly Vec2[], planes: Float64Array, out: number): Outline {
  const far = 1 + 2 * out + Math.max(0, ...polygon.flat().map(Math.abs));
  let left: readonly Vec2[] = [[-far, -far], [far, -far], [far, far], [-far, far]];
  for (let p = 0; p < planes.length; p += 3) {
    const [nx, ny, c] = [planes[p] as number, planes[p + 1] as number, planes[p + 2] as number];
    left = clipByHalfPlane(left, [nx * c, ny * c], [-nx, -ny]);
  }
  return { planes, corners: Float64Array.from(left.flat()) };
}
