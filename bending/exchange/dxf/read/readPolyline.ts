import type { BulgedPoint, DxfShape } from "./dxfDrawing";
import { entityFields } from "./entityFields";
import type { RawEntity } from "./rawEntity";

const CLOSED = 1;
/** Curve-fitted, spline-fitted, 3D and mesh polylines; the first two hold their fitted vertices and read as they are. */
const MESH = 16 | 64;
const CONTROL_VERTEX = 16;

/** A light polyline (its vertices in its own groups) or an old one (vertices as entities that follow); `flip` mirrors it. */
export function readPolyline(raw: RawEntity, vertices: readonly RawEntity[], flip: boolean): DxfShape | string {
  const flags = Math.trunc(entityFields(raw).number(70, "the flags", 0)) || 0;
  if (raw.kind === "POLYLINE" && (flags & MESH) !== 0) return "it is a mesh, not a line";
  const sign = flip ? -1 : 1;
  const points = raw.kind === "LWPOLYLINE" ? lightVertices(raw) : oldVertices(vertices);
  if (typeof points === "string") return points;
  if (points.length < 2) return `it has ${points.length} ${points.length === 1 ? "vertex" : "vertices"}; two at least were expected`;
  return { kind: "POLYLINE", closed: (flags & CLOSED) !== 0, points: points.map(([x, y, bulge]): BulgedPoint => [x * sign, y, bulge * sign]) };
}

function lightVertices(raw: RawEntity): readonly BulgedPoint[] | string {
  const points: [number, number, number][] = [];
  for (const { code, value, line } of raw.tags) {
    if (code !== 10 && code !== 20 && code !== 42) continue;
    const number = Number(value);
    if (!Number.isFinite(number) || value.trim() === "" || Math.abs(number) > 1e8) return `line ${line}: a coordinate or bulge (group ${code}) was expected, but there stands "${value.trim().slice(0, 30)}"`;
    if (code === 10) points.push([number, NaN, 0]);
    else {
      const last = points[points.length - 1];
      if (!last) return `line ${line}: a vertex must begin with its x (group 10)`;
      last[code === 20 ? 1 : 2] = number;
    }
  }
  return points.some(([, y]) => Number.isNaN(y)) ? "a vertex has no y (group 20)" : points;
}

function oldVertices(vertices: readonly RawEntity[]): readonly BulgedPoint[] | string {
  const points: BulgedPoint[] = [];
  for (const vertex of vertices) {
    const fields = entityFields(vertex);
    if ((Math.trunc(fields.number(70, "the flags", 0)) & CONTROL_VERTEX) !== 0) continue;
    points.push([fields.number(10, "x"), fields.number(20, "y"), fields.number(42, "the bulge", 0)]);
    const problem = fields.problem();
    if (problem) return `line ${problem.line}: ${problem.message}`;
  }
  return points;
}
