import * as polyclip from "polyclip-ts";
import { convexOverlap } from "../geometry/convexOverlap";
import { convexPieces } from "../geometry/convexPieces";
import { polygonBounds, type Bounds2 } from "../geometry/polygonBounds";
import type { FlatPoint, Vec2 } from "../geometry/vec2";
import type { PartModel } from "./partModel";

/** Two regions may lap by rounding; more than this cannot be cut out of one sheet (mm). */
const LAP_MM = 1e-3;

/** Two faces, each with the bend that carries it, that lie over one another in the unfolded sheet. */
export interface FlatOverlap {
  /** Indices of the faces, the lower first. */
  readonly faces: readonly [number, number];
  /** What both would need, as counter-clockwise outlines in the sheet. */
  readonly regions: readonly (readonly FlatPoint[])[];
}

type Piece = Bounds2 & { readonly points: readonly Vec2[]; readonly face: number };

/** Every pair of faces that cannot be cut from one sheet, and where; empty when the part can be unfolded, as one drawn as a flat always can. */
export function flatOverlaps(part: Pick<PartModel, "faces" | "bends" | "drawnFlat">): readonly FlatOverlap[] {
  if (part.drawnFlat) return [];
  const pieces = part.faces.flatMap((face, index): readonly Piece[] => {
    const bend = face.bend === null ? undefined : part.bends[face.bend];
    return [...convexPieces(face.outline), ...(bend ? [bend.zone] : [])].map((points) => ({ points, face: index, ...polygonBounds(points) }));
  });
  const meeting = new Map<string, [Piece, Piece][]>();
  // Swept along x, so that only what lies near is compared.
  const swept = [...pieces].sort((p, q) => p.min[0] - q.min[0]);
  swept.forEach((p, i) => {
    for (let k = i + 1; k < swept.length; k++) {
      const q = swept[k];
      if (!q || q.min[0] > p.max[0]) break;
      if (q.face === p.face || q.min[1] > p.max[1] || p.min[1] > q.max[1]) continue;
      if (convexOverlap(p.points, q.points) <= LAP_MM) continue;
      const key = `${Math.min(p.face, q.face)} ${Math.max(p.face, q.face)}`;
      meeting.set(key, [...(meeting.get(key) ?? []), [p, q]]);
    }
  });
  return [...meeting]
    .map(([key, pairs]): FlatOverlap => {
      const [a = 0, b = 0] = key.split(" ").map(Number);
      return { faces: [a, b], regions: shared(pairs) };
    })
    .sort((p, q) => p.faces[1] - q.faces[1] || p.faces[0] - q.faces[0]);
}

function shared(pairs: readonly (readonly [Piece, Piece])[]): readonly (readonly FlatPoint[])[] {
  const ring = ({ points }: Piece): [number, number][][] => [points.map(([x, y]) => [x, y])];
  const [first, ...rest] = pairs.map(([p, q]) => polyclip.intersection(ring(p), ring(q)));
  return first ? polyclip.union(first, ...rest).map((polygon) => (polygon[0] ?? []).slice(0, -1).map(([x, y]): FlatPoint => [x, y])) : [];
}
