import type { Vec2 } from "../geometry/vec2";
import type { ConvexPiece, Outline, PieceRole, Shape } from "./convexPiece";

const OTHER: Record<PieceRole, PieceRole> = { tip: "tip", body: "body", left: "right", right: "left" };

/** The shape with front and back exchanged. */
export function mirrorShape(shape: Shape): Shape {
  return shape.map((piece): ConvexPiece => ({
    role: OTHER[piece.role],
    corners: piece.corners.map(([x, y]): Vec2 => [-x, y]).reverse(),
    withMargin: mirrorOutline(piece.withMargin),
    withoutSkin: mirrorOutline(piece.withoutSkin),
    box: [-piece.box[1], -piece.box[0], piece.box[2], piece.box[3]],
  }));
}

function mirrorOutline({ planes, corners }: Outline): Outline {
  return { planes: planes.map((value, i) => (i % 3 === 0 ? -value : value)), corners: corners.map((value, i) => (i % 2 === 0 ? -value : value)) };
}
