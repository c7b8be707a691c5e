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
  rings.forEach((points, ring) => points.forEach((p, edge) => {
    const [a, h] = onEdge(axes, p);
    const [b, g] = onEdge(axes, points[(edge + 1) % points.length] ?? p);
    if (h > 0 === g > 0) return;
    const share = h / (h - g);
    const along = a + (b - a) * share;
    crossings.push({ along, place: { ring, edge, share, point: fromEdge(axes, [along, 0]) } });
  }));
  crossings.sort((p, q) => p.along - q.along);
  const chords: MaterialChord[] = [];
  for (let i = 0; i + 1 < crossings.length; i += 2) {
    const [start, end] = [crossings[i], crossings[i + 1]];
    if (start && end && end.along > start.along) chords.push({ from: start.along, to: end.along, start: start.place, end: end.place });
  }
  return chords;
}
