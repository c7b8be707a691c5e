import { EMPTY_AREA_MM2, MEANT_CONTACT_MM, SAME_POINT_MM } from "../core/tolerance";
import type { Mm } from "../core/units";
import { clipByHalfPlane } from "../geometry/clipByHalfPlane";
import { convexPieces } from "../geometry/convexPieces";
import { onStretch } from "../geometry/onStretch";
import { signedArea } from "../geometry/signedArea";
import type { ProfilePoint, Vec2 } from "../geometry/vec2";
import type { ConvexPiece, PieceRole, Shape } from "./convexPiece";
import { pieceOf } from "./pieceOf";

/** A straight cut of a profile: what lies on the side of `normal` has the role `beyond`, the rest `before`. */
export interface RoleCut {
  readonly point: Vec2;
  readonly normal: Vec2;
  readonly before: PieceRole;
  readonly beyond: PieceRole;
}

/** A profile cut into convex pieces, each kept off by `margin`, and for meant contact without a skin of `MEANT_CONTACT_MM`. */
export function shapeOf(profile: readonly ProfilePoint[], margin: Mm, cut: RoleCut | null): Shape {
  return convexPieces(profile).flatMap((whole): readonly ConvexPiece[] => {
    if (!cut) return piece(whole, "body", profile, margin);
    const back: Vec2 = [-cut.normal[0], -cut.normal[1]];
    return [
      ...piece(clipByHalfPlane(whole, cut.point, back), cut.before, profile, margin),
      ...piece(clipByHalfPlane(whole, cut.point, cut.normal), cut.beyond, profile, margin),
    ];
  });
}

function piece(corners: readonly Vec2[], role: PieceRole, profile: readonly ProfilePoint[], margin: Mm): readonly ConvexPiece[] {
  if (corners.length < 3 || signedArea(corners) < EMPTY_AREA_MM2) return [];
  const skin = corners.map((p, i) => (onOutline(p, corners[(i + 1) % corners.length] ?? p, profile) ? -MEANT_CONTACT_MM : 0));
  return [pieceOf(role, corners, margin, (side) => skin[side] ?? 0)];
}

/** Sides between two pieces lose no skin, or a thin corner could slip between them. */
function onOutline(p: Vec2, q: Vec2, profile: readonly ProfilePoint[]): boolean {
  return profile.some((a, i) => {
    const b = profile[(i + 1) % profile.length] ?? a;
    return [p, q].every((r) => onStretch(a, b, r, SAME_POINT_MM));
  });
}
