import earcut from "earcut";
import { signedArea } from "../../geometry/signedArea";
import type { FlatPoint } from "../../geometry/vec2";
import type { Vec3 } from "../../geometry/vec3";
import type { FlatRegion } from "../../part/partModel";

/** A point of the sheet at height z (0 underside, thickness top) and where it stands in the folded part. */
export type Fold = (point: FlatPoint, z: number) => Vec3;

/**
 * The closed skin of sheet regions carried by `fold`: top, underside and walls. `inner` tells the edges that lie between regions of one body,
 * where there is no wall.
 */
export function plateMesh(regions: readonly FlatRegion[], thickness: number, fold: Fold, inner: (a: FlatPoint, b: FlatPoint) => boolean): { readonly corners: readonly Vec3[]; readonly normals: readonly Vec3[] } {
  const corners: Vec3[] = [];
  const normals: Vec3[] = [];
  const push = (corner: Vec3, normal: Vec3) => { corners.push(corner); normals.push(normal); };
  for (const region of regions) {
    const rings = [counterClockwise(region.outline), ...region.holes.map((hole) => [...counterClockwise(hole)].reverse())];
    const points = rings.flat();
    const starts = rings.slice(1).map((_, i) => rings.slice(0, i + 1).reduce((sum, one) => sum + one.length, 0));
    const triangles = earcut(points.flatMap(([x, y]) => [x, y]), starts.length > 0 ? starts : null, 2);
    for (let i = 0; i + 2 < triangles.length; i += 3) {
      const [a, b, c]: readonly [FlatPoint, FlatPoint, FlatPoint] = [points[triangles[i] ?? 0] ?? [0, 0], points[triangles[i + 1] ?? 0] ?? [0, 0], points[triangles[i + 2] ?? 0] ?? [0, 0]];
      const turn: readonly FlatPoint[] = signedArea([a, b, c]) >= 0 ? [a, b, c] : [a, c, b];
      for (const p of turn) push(fold(p, thickness), through(fold, p, thickness, 1));
      for (const p of [...turn].reverse()) push(fold(p, 0), through(fold, p, thickness, -1));
    }
    for (const one of rings) {
      one.forEach((a, i) => {
        const b = one[(i + 1) % one.length] ?? a;
        if (inner(a, b)) return;
        const quad = [fold(a, 0), fold(b, 0), fold(b, thickness), fold(a, thickness)] as const;
        const normal = facing(quad[0], quad[1], quad[2], quad[3]);
        for (const corner of [quad[0], quad[1], quad[2], quad[0], quad[2], quad[3]]) push(corner, normal);
      });
    }
  }
  return { corners, normals };
}

const counterClockwise = (polygon: readonly FlatPoint[]): readonly FlatPoint[] => (signedArea(polygon) < 0 ? [...polygon].reverse() : polygon);

/** Unit vector through the sheet, from the underside to the top, or back. */
function through(fold: Fold, p: FlatPoint, thickness: number, sign: number): Vec3 {
  const [a, b] = [fold(p, 0), fold(p, thickness)];
  return unit([(b[0] - a[0]) * sign, (b[1] - a[1]) * sign, (b[2] - a[2]) * sign]);
}

/** Normal of a quad by its diagonals. */
function facing(a: Vec3, b: Vec3, c: Vec3, d: Vec3): Vec3 {
  const [u, v] = [[c[0] - a[0], c[1] - a[1], c[2] - a[2]] as const, [d[0] - b[0], d[1] - b[1], d[2] - b[2]] as const];
  return unit([u[1] * v[2] - u[2] * v[1], u[2] * v[0] - u[0] * v[2], u[0] * v[1] - u[1] * v[0]]);
}

function unit(v: Vec3): Vec3 {
  const length = Math.hypot(v[0], v[1], v[2]);
  return length === 0 ? [0, 0, 1] : [v[0] / length, v[1] / length, v[2] / length];
}
