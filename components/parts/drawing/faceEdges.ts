import type { Vec2 } from "@/bending/geometry/vec2";
import type { BaseShape } from "@/bending/part/partDocument";
import type { PartModel } from "@/bending/part/partModel";
import type { FaceEdge } from "@/components/preview/partPicking";

interface Way { readonly edge: number; readonly out: Vec2; readonly offset: number | null }

const dot = (a: Vec2, b: Vec2): number => a[0] * b[0] + a[1] * b[1];
const outwardOf = (a: Vec2, b: Vec2): Vec2 => {
  const size = Math.hypot(b[0] - a[0], b[1] - a[1]);
  return [(b[1] - a[1]) / size, -(b[0] - a[0]) / size];
};

/** For each edge of each face that carries no flange yet: the longest straight stretch of the outline that lies along it. */
export function faceEdges(part: PartModel, base: BaseShape, scale: number): readonly FaceEdge[] {
  return part.faces.flatMap((face, index) => {
    const ways = index === 0 ? baseWays(base, scale) : flangeWays(part, index);
    return ways.flatMap(({ edge, out, offset }) => {
      const line = longest(face.outline, out, offset, part, index);
      return line === null ? [] : [{ face: face.id, edge, line }];
    });
  });
}

function baseWays(base: BaseShape, scale: number): readonly Way[] {
  return base.outline.flatMap((vertex, edge) => {
    const next = base.outline[(edge + 1) % base.outline.length];
    if (next === undefined || (vertex[2] ?? 0) !== 0) return [];
    const a: Vec2 = [vertex[0] * scale, vertex[1] * scale];
    const out = outwardOf(a, [next[0] * scale, next[1] * scale]);
    return [{ edge, out, offset: dot(a, out) }];
  });
}

/** End side, far edge and start side of a flange, as along the edge that carries it. */
function flangeWays(part: PartModel, index: number): readonly Way[] {
  const bend = part.bends[index - 1];
  if (bend === undefined) return [];
  const out = outwardOf(bend.line[0], bend.line[1]);
  const along: Vec2 = [-out[1], out[0]];
  return [{ edge: 1, out: along, offset: null }, { edge: 2, out, offset: null }, { edge: 3, out: [-along[0], -along[1]], offset: null }];
}

/** A tapered side still counts as its side: up to 40 degrees off. */
const near = Math.cos((40 * Math.PI) / 180);

function longest(outline: readonly Vec2[], out: Vec2, offset: number | null, part: PartModel, face: number): readonly [Vec2, Vec2] | null {
  let best: readonly [Vec2, Vec2] | null = null;
  let size = 2;
  outline.forEach((a, i) => {
    const b = outline[(i + 1) % outline.length];
    if (b === undefined) return;
    const length = Math.hypot(b[0] - a[0], b[1] - a[1]);
    if (length <= size || dot(outwardOf(a, b), out) < (offset === null ? near : 0.9999)) return;
    if (offset !== null && Math.abs(dot(a, out) - offset) > 0.01) return;
    if (carriesBend(part, face, a, b)) return;
    best = [a, b];
    size = length;
  });
  return best;
}

/** True when a bend zone begins along this stretch. */
function carriesBend(part: PartModel, face: number, a: Vec2, b: Vec2): boolean {
  const middle: Vec2 = [(a[0] + b[0]) / 2, (a[1] + b[1]) / 2];
  const off = (p: Vec2, q: Vec2) => Math.abs(dot([middle[0] - p[0], middle[1] - p[1]], outwardOf(p, q)));
  return part.bends.some((bend) => {
    const [p, q] = bend.parent === face ? [bend.zone[0], bend.zone[3]] : bend.child === face ? [bend.zone[1], bend.zone[2]] : [null, null];
    if (p === null || q === null || off(p, q) > 0.01) return false;
    const way: Vec2 = [q[0] - p[0], q[1] - p[1]];
    const t = dot([middle[0] - p[0], middle[1] - p[1]], way) / dot(way, way);
    return t > -0.01 && t < 1.01;
  });
}
