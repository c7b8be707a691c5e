import { EMPTY_AREA_MM2 } from "../core/tolerance";
import { signedArea } from "../geometry/signedArea";
import type { Vec2 } from "../geometry/vec2";
import { cutEnds } from "./cutEnds";
import type { DrawnFace } from "./drawnFace";
import type { EdgeCut } from "./edgeCut";
import { planeByClipping } from "./planeByClipping";
import { planeByWalking } from "./planeByWalking";

/**
 * The plane part of a drawn face: what is left when every bend on its edges has taken its strip and its
 * reliefs. Null when nothing or more than one piece is left.
 *
 * A strip whose inset is 0 runs on to the neighbouring side; where the next edge is bent as well, both
 * run on, so the two plane edges meet in one point and the flanges keep clear of one another.
 */
export function planeOutline(face: DrawnFace, cuts: readonly EdgeCut[]): readonly Vec2[] | null {
  const ends = cutEnds(face, cuts);
  const plane = planeByWalking(face, ends) ?? planeByClipping(face, ends);
  return plane && signedArea(plane) > EMPTY_AREA_MM2 ? plane : null;
}
