import { ARC_CHORD_MM } from "../core/tolerance";
import { arcToChords } from "../geometry/arcToChords";
import { circleToChords } from "../geometry/circleToChords";
import { signedArea } from "../geometry/signedArea";
import type { Vec2 } from "../geometry/vec2";
import { outlineAsChords } from "./outlineAsChords";
import type { DocumentHole } from "./partDocument";

/** A drawn hole (mm) as a counter-clockwise polygon. */
export function holeAsChords(hole: DocumentHole): readonly Vec2[] {
  if ("circle" in hole) return circleToChords(hole.circle, hole.diameter / 2, ARC_CHORD_MM);
  if ("slot" in hole) return slotAsChords(hole.slot[0], hole.slot[1], hole.width / 2);
  const { points } = outlineAsChords(hole.polygon);
  return signedArea(points) < 0 ? [...points].reverse() : points;
}

/** A slot runs from centre to centre of its round ends. */
function slotAsChords(a: Vec2, b: Vec2, radius: number): readonly Vec2[] {
  const length = Math.hypot(b[0] - a[0], b[1] - a[1]);
  if (length === 0) return circleToChords(a, radius, ARC_CHORD_MM);
  const [nx, ny] = [((b[1] - a[1]) / length) * radius, ((a[0] - b[0]) / length) * radius];
  const p: Vec2 = [a[0] + nx, a[1] + ny];
  const q: Vec2 = [b[0] + nx, b[1] + ny];
  const r: Vec2 = [b[0] - nx, b[1] - ny];
  const s: Vec2 = [a[0] - nx, a[1] - ny];
  // Each end is half a turn counter-clockwise: bulge 1.
  return [q, ...arcToChords(q, r, 1, ARC_CHORD_MM), s, ...arcToChords(s, p, 1, ARC_CHORD_MM)];
}
