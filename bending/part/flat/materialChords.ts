import type { Vec2 } from "../../geometry/vec2";
import { fromEdge, onEdge, type EdgeAxes } from "../edgeCut";
import type { RingPlace, Rings } from "./ringPlace";

/** A stretch of material along a line. */
export interface MaterialChord {
  readonly from: number;
  readonly to: number;
  readonly start: RingPlace;
  readonly end: RingPlace;
}

/** Where a line, drawn out both ways, runs over the sheet, from its start on. */
export function materialChords(rings: Rings, axes: EdgeAxes): readonly MaterialChord[] {
  const crossings: { readonly along: number; readonly place: RingPlace }[] = [];
  const { origin, along: [ux, uy] } = axes;
  const height = (p: Vec2) => (p[1] - origin[1]) * ux - (p[0] - origin[0]) * uy;
  rings.forEach((points, ring) => {
    let [p, h] = [points[0] ?? origin, height(points[0] ?? origin)];
    for (let edge = 0; edge < points.length; edge++) {
      const q = points[(edge + 1) % points.length] ?? p;
      const g = height(q);
      if (h > 0 !== g > 0) {
        const share = h / (h - g);
        const [a, b] = [onEdge(axes, p)[0], onEdge(axes, q)[0]];
        const along = a + (b - a) * share;
        crossings.push({ along, place: { ring, edge, share, point: fromEdge(axes, [along, 0]) } });
      }
      [p, h] = [q, g];
    }
  });
  crossings.sort((p, q) => p.along - q.along);
  const chords: MaterialChord[] = [];
  for (let i = 0; i + 1 < crossings.length; i += 2) {
    const [start, end] = [crossings[i], crossings[i + 1]];
    if (start && end && end.along > start.along) chords.push({ from: start.along, to: end.along, start: start.place, end: end.place });
  }
  return chords;
}
