import type { ConvexPiece, Outline } from "./convexPiece";
import type { Prism } from "./prism";

/**
 * Which outline judges a prism at the back against a piece. Meant contact: what lies in the plane of a wing may touch a
 * punch's tip; what lies in that plane or over it may touch the die's half under the wing, from which the plane keeps it.
 * The margin holds for everything else.
 */
export function outlineFor(piece: ConvexPiece, lies: Prism["lies"]): Outline {
  const meant = piece.role === "tip" ? lies === "plane" : piece.role === "right" && lies !== "outside";
  return meant ? piece.withoutSkin : piece.withMargin;
}
