import type { Vec2 } from "../geometry/vec2";
import type { DocumentHole } from "./partDocument";
import type { FlatContour } from "./partModel";
import { reversedPath } from "./reversedPath";

/**
 * A drawn hole (mm) as an exact contour; `place` lays its points into the sheet, and `mirrored` says that it turns
 * them over on the way (a flange's own plane has its second axis away from the bend).
 */
export function holeContour(hole: DocumentHole, place: (p: Vec2) => Vec2, mirrored: boolean): FlatContour {
  if ("circle" in hole) return { kind: "circle", centre: place(hole.circle), radius: hole.diameter / 2 };
  const path = "slot" in hole ? slotPath(hole.slot[0], hole.slot[1], hole.width / 2) : hole.polygon.map((v) => [v[0], v[1], v[2] ?? 0] as const);
  if (path.length === 1) return { kind: "circle", centre: place([path[0]?.[0] ?? 0, path[0]?.[1] ?? 0]), radius: path[0]?.[2] ?? 0 };
  const placed = path.map(([x, y, bulge]) => [...place([x, y]), mirrored ? -bulge : bulge] as const);
  return { kind: "path", vertices: mirrored ? reversedPath(placed) : placed };
}

/** Counter-clockwise; a slot whose centres are one point is a circle, given as one vertex with its radius. */
function slotPath(a: Vec2, b: Vec2, radius: number): readonly (readonly [number, number, number])[] {
  const length = Math.hypot(b[0] - a[0], b[1] - a[1]);
  if (length === 0) return [[a[0], a[1], radius]];
  const [nx, ny] = [((b[1] - a[1]) / length) * radius, ((a[0] - b[0]) / length) * radius];
  return [[a[0] + nx, a[1] + ny, 0], [b[0] + nx, b[1] + ny, 1], [b[0] - nx, b[1] - ny, 0], [a[0] - nx, a[1] - ny, 1]];
}
