import { SAME_POINT_MM } from "../core/tolerance";
import { cutEnds } from "./cutEnds";
import type { DrawnFace } from "./drawnFace";
import { fromEdge, type EdgeCut } from "./edgeCut";
import type { FlatCircle } from "./partModel";

/** The circles at the ends of round reliefs, in the face's local coordinates. */
export function reliefCircles(face: DrawnFace, cuts: readonly EdgeCut[]): readonly FlatCircle[] {
  return cutEnds(face, cuts).flatMap(({ cut, axes, start, end }) => {
    if (cut.relief?.kind !== "round") return [];
    const depth = Math.max(cut.relief.depth, cut.depth);
    return [[start.relief, start.at - start.relief / 2], [end.relief, end.at + end.relief / 2]].flatMap(([width = 0, middle = 0]): readonly FlatCircle[] => {
      const radius = width / 2;
      return radius > 0 && radius <= depth + SAME_POINT_MM ? [{ centre: fromEdge(axes, [middle, Math.max(0, depth - radius)]), radius }] : [];
    });
  });
}
