import type { FieldProblem } from "../core/problem";
import { SAME_POINT_MM } from "../core/tolerance";
import type { LengthUnit, Mm } from "../core/units";
import type { FlangeWork } from "./faceWork";
import { formatLength } from "../core/formatLength";
import type { DimensionKind } from "./partDocument";
import type { PartSource } from "./partSource";
import { setback } from "./setback";

/** Plane length that must be left between two bends, or a bend and an edge (mm): enough to be a face at all. */
const LEAST_PLANE_MM = 0.01;

/** Legs that are shorter than what their bends take of them. */
export function checkFaceLengths(
  source: PartSource, flanges: readonly FlangeWork[], dimension: DimensionKind, thickness: Mm, units: LengthUnit,
): readonly FieldProblem[] {
  const problems: FieldProblem[] = [];
  const takes = (kind: DimensionKind, flange: FlangeWork) => setback(kind, flange.bend.angle, flange.bend.insideRadius, thickness);
  const check = (path: string, length: number, kind: DimensionKind, bends: readonly FlangeWork[]) => {
    const taken = bends.reduce((sum, bend) => sum + takes(kind, bend), 0);
    if (length - taken >= LEAST_PLANE_MM) return;
    const parts = bends.map((flange) => `bend "${flange.entry.id}" takes ${formatLength(takes(kind, flange), units)}`).join(" and ");
    problems.push({ path, message: `${formatLength(length, units)} is too short: ${parts || "nothing is left"}; it must be more than ${formatLength(taken, units)}` });
  };
  const farOn = new Map<string, FlangeWork[]>();
  for (const flange of flanges) if (flange.entry.edge === 2) farOn.set(flange.entry.on, [...(farOn.get(flange.entry.on) ?? []), flange]);
  for (const flange of flanges) {
    const { entry } = flange;
    if (entry.length === undefined) continue;
    const kind = entry.dimension ?? dimension;
    check(flange.lengthPath, entry.length, kind, [flange, ...deepest(farOn.get(entry.id) ?? [], (one) => takes(kind, one))]);
    if (entry.hem !== "teardrop" || entry.angle > 180) continue;
    const [least, leg] = [flange.bend.insideRadius, entry.length - takes(kind, flange)];
    if (leg < least - SAME_POINT_MM) problems.push({ path: flange.lengthPath, message: `${formatLength(entry.length, units)} is too short: the leg has to close the loop, so it must be at least ${formatLength(least + takes(kind, flange), units)}` });
  }
  const first = flanges.find(({ entry }) => entry.on === "base");
  if (source.basePath === "profile.legs[0]") {
    check(source.basePath, source.base.outline[1]?.[0] ?? 0, dimension, first ? [first] : []);
    return problems;
  }
  const onBase = flanges.filter(({ entry }) => entry.on === "base");
  for (const [i, a] of onBase.entries()) {
    for (const b of onBase.slice(i + 1)) {
      const apart = opposite(source, a, b);
      if (apart !== null) check(source.basePath, apart, dimension, [a, b]);
    }
  }
  return problems;
}

/** Of several bends on one edge, the one that takes most. */
function deepest(bends: readonly FlangeWork[], takes: (bend: FlangeWork) => number): readonly FlangeWork[] {
  return bends.length < 2 ? bends : [bends.reduce((most, bend) => (takes(bend) > takes(most) ? bend : most))];
}

/** How far apart two base edges are that face each other squarely, else null. */
function opposite(source: PartSource, a: FlangeWork, b: FlangeWork): number | null {
  const edge = (flange: FlangeWork) => {
    const { outline } = source.base;
    const p = outline[flange.entry.edge] ?? [0, 0];
    const q = outline[(flange.entry.edge + 1) % outline.length] ?? p;
    const length = Math.hypot(q[0] - p[0], q[1] - p[1]);
    return { p, u: [(q[0] - p[0]) / length, (q[1] - p[1]) / length] as const, length };
  };
  const [m, n] = [edge(a), edge(b)];
  if (m.u[0] * n.u[0] + m.u[1] * n.u[1] > -1 + 1e-9) return null;
  const [dx, dy] = [n.p[0] - m.p[0], n.p[1] - m.p[1]];
  const along = dx * m.u[0] + dy * m.u[1];
  const apart = m.u[0] * dy - m.u[1] * dx;
  const faceEachOther = Math.min(along, m.length) > Math.max(along - n.length, 0);
  return faceEachOther && apart > 0 ? apart : null;
}
