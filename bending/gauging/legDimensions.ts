import { PARALLEL_RAD, SAME_SIZE_MM } from "../core/tolerance";
import type { PartModel } from "../part/partModel";
import { faceEnds, type FaceEnd } from "./faceEnds";
import type { DimensionEnd, PartDimension } from "./partDimension";

/** The lengths of every face across its bends: from each bend's outside to the opposite bend's, else to the far edge. */
export function legDimensions(part: PartModel): readonly PartDimension[] {
  return part.faces.flatMap((_, face) => {
    const ends = faceEnds(part, face);
    const taken = new Set<string>();
    return ends.flatMap((end): readonly PartDimension[] => {
      const opposite = oppositeBend(ends, end);
      const far = farEdge(part, face, end, ends);
      const to: DimensionEnd | null = opposite !== null && (opposite.overlap > 0 || far === null) ? { at: "outside", face, bend: opposite.end.bend } : far;
      if (to === null) return [];
      const key = to.at === "outside" ? [end.bend, to.bend].sort((a, b) => a - b).join("/") : `${end.bend}`;
      if (taken.has(key)) return [];
      taken.add(key);
      return [{ kind: "leg", face, direction: [-end.out[0], -end.out[1], 0], from: [{ at: "outside", face, bend: end.bend }], to: [to] }];
    });
  });
}

/** The bend that looks the other way and stands opposite the longest stretch of this one; where none overlaps, the nearest to that. */
function oppositeBend(ends: readonly FaceEnd[], { bend, out, at, span }: FaceEnd): { readonly end: FaceEnd; readonly overlap: number } | null {
  let best: { readonly end: FaceEnd; readonly overlap: number } | null = null;
  for (const end of ends) {
    const parallel = end.bend !== bend && end.out[0] * out[0] + end.out[1] * out[1] < -Math.cos(PARALLEL_RAD);
    if (!parallel || -end.at > at) continue;
    // Seen the other way, the span along the face runs backwards.
    const overlap = Math.min(span[1], -end.span[0]) - Math.max(span[0], -end.span[1]);
    if (best === null || overlap > best.overlap) best = { end, overlap };
  }
  return best;
}

/** The corner of the face's outline that lies farthest from the bend, when that is no bend's. */
function farEdge(part: PartModel, face: number, { out }: FaceEnd, ends: readonly FaceEnd[]): DimensionEnd | null {
  const outline = part.faces[face]?.outline ?? [];
  const depths = outline.map((p) => -(p[0] * out[0] + p[1] * out[1]));
  const farthest = Math.max(...depths);
  const bent = ends.some((end) => end.out[0] * out[0] + end.out[1] * out[1] < -Math.cos(PARALLEL_RAD) && end.at > farthest - SAME_SIZE_MM);
  const corner = depths.findIndex((depth) => depth > farthest - SAME_SIZE_MM);
  const point = outline[corner];
  if (bent || !point) return null;
  const next = depths[(corner + 1) % depths.length] ?? 0;
  const before = depths[(corner + depths.length - 1) % depths.length] ?? 0;
  const edge = next > farthest - SAME_SIZE_MM ? corner : before > farthest - SAME_SIZE_MM ? (corner + outline.length - 1) % outline.length : null;
  return { at: "point", face, point: [point[0], point[1], 0], name: edge === null ? "farthest corner" : `edge ${edge}` };
}
