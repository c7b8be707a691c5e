import type { FieldProblem } from "../core/problem";
import { convexOverlap } from "../geometry/convexOverlap";
import { convexPieces } from "../geometry/convexPieces";
import { polygonBounds } from "../geometry/polygonBounds";
import type { Vec2 } from "../geometry/vec2";
import type { PartDocument } from "./partDocument";
import type { PartModel } from "./partModel";

/** Two regions may lap by rounding; more than this cannot be cut out of one sheet (mm). */
const LAP_MM = 1e-3;

/** Faces (each with its bend zone) that lie over one another in the unfolded sheet; each pair is told once. */
export function flatsOverlap(part: PartModel, document: PartDocument): readonly FieldProblem[] {
  const regions = part.faces.map((face) => {
    const bend = face.bend === null ? undefined : part.bends[face.bend];
    const pieces: readonly (readonly Vec2[])[] = [...convexPieces(face.outline), ...(bend ? [bend.zone] : [])];
    return { id: face.id, pieces: pieces.map((points) => ({ points, ...polygonBounds(points) })), bounds: polygonBounds(pieces.flat()) };
  });
  const problems: FieldProblem[] = [];
  regions.forEach((b, j) => {
    for (const a of regions.slice(0, j)) {
      if (apart(a.bounds, b.bounds)) continue;
      if (!a.pieces.some((p) => b.pieces.some((q) => !apart(p, q) && convexOverlap(p.points, q.points) > LAP_MM))) continue;
      problems.push({ path: pathOf(b.id, document), message: `"${b.id}" and "${a.id}" overlap in the unfolded sheet, so they cannot be cut from one piece; shorten one, inset it (start, end) or taper its sides` });
    }
  });
  return problems;
}

type Box = { readonly min: Vec2; readonly max: Vec2 };
const apart = (a: Box, b: Box) => a.max[0] < b.min[0] || b.max[0] < a.min[0] || a.max[1] < b.min[1] || b.max[1] < a.min[1];

function pathOf(id: string, document: PartDocument): string {
  if (document.flanges) return `flanges[${document.flanges.findIndex((flange) => flange.id === id)}]`;
  if (document.profile) return `profile.bends[${Number(id.slice(1)) - 1}]`;
  return "flat";
}
