import type { FlatPoint } from "../geometry/vec2";
import type { Bend, Face } from "./partModel";

/** Zones are built from the very edges, so rounding alone separates them (mm). */
const ON_EDGE_MM = 1e-5;

/** The faces with a corner wherever a bend begins or ends, so that each bend lies along one whole edge of both its faces. */
export function withZoneCorners(faces: readonly Face[], bends: readonly Bend[]): readonly Face[] {
  const wanted = faces.map((): FlatPoint[] => []);
  for (const { parent, child, zone: [parentStart, childStart, childEnd, parentEnd] } of bends) {
    wanted[parent]?.push(parentStart, parentEnd);
    wanted[child]?.push(childStart, childEnd);
  }
  return faces.map((face, i) => {
    const missing = (wanted[i] ?? []).filter((p) => !face.outline.some((q) => Math.abs(p[0] - q[0]) <= ON_EDGE_MM && Math.abs(p[1] - q[1]) <= ON_EDGE_MM));
    return missing.length === 0 ? face : { ...face, outline: missing.reduce(withCorner, face.outline) };
  });
}

function withCorner(outline: readonly FlatPoint[], p: FlatPoint): readonly FlatPoint[] {
  const at = outline.findIndex((a, i) => {
    const b = outline[(i + 1) % outline.length] ?? a;
    const length = Math.hypot(b[0] - a[0], b[1] - a[1]);
    const [ux, uy] = [(b[0] - a[0]) / length, (b[1] - a[1]) / length];
    const along = (p[0] - a[0]) * ux + (p[1] - a[1]) * uy;
    return along > 0 && along < length && Math.abs((p[0] - a[0]) * uy - (p[1] - a[1]) * ux) <= ON_EDGE_MM;
  });
  return at < 0 ? outline : [...outline.slice(0, at + 1), p, ...outline.slice(at + 1)];
}
