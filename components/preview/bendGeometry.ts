import { BufferAttribute, BufferGeometry } from "three";
import type { Bend } from "@/bending/part/partModel";
import { zonePoint } from "@/lib/sheet/bendPrisms";

const SLABS = 12;

/** The bend zone at an angle, smooth across the bend, in the parent face's sheet coordinates. Groups as for faces. */
export function bendGeometry(bend: Bend, thickness: number, angle: number): BufferGeometry {
  const corners: number[] = [];
  const point = (v: number, end: boolean, z: number): number => corners.push(...zonePoint(bend, thickness, angle, v / SLABS, end, z)) / 3 - 1;
  const strip = (z: number): readonly (readonly [number, number])[] => Array.from({ length: SLABS + 1 }, (_, v) => [point(v, false, z), point(v, true, z)] as const);
  const [top, under] = [strip(thickness), strip(0)];
  const topEdge = strip(thickness);
  const underEdge = strip(0);
  const faces: number[] = [];
  const quad = (a: number, b: number, c: number, d: number): number => faces.push(a, b, c, a, c, d);
  const pairs = (rows: typeof top, draw: (near: readonly [number, number], far: readonly [number, number]) => void): void => {
    for (let i = 0; i < SLABS; i++) {
      const [near, far] = [rows[i], rows[i + 1]];
      if (near && far) draw(near, far);
    }
  };
  pairs(top, (near, far) => quad(near[0], far[0], far[1], near[1]));
  const topCount = faces.length;
  pairs(under, (near, far) => quad(near[0], near[1], far[1], far[0]));
  const underCount = faces.length - topCount;
  for (const end of [0, 1] as const) {
    for (let i = 0; i < SLABS; i++) {
      const [a, b, c, d] = [underEdge[i]?.[end] ?? 0, underEdge[i + 1]?.[end] ?? 0, topEdge[i + 1]?.[end] ?? 0, topEdge[i]?.[end] ?? 0];
      if (end === 0) quad(a, b, c, d);
      else quad(a, d, c, b);
    }
  }
  const geometry = new BufferGeometry();
  geometry.setAttribute("position", new BufferAttribute(new Float32Array(corners), 3));
  geometry.setIndex(faces);
  geometry.addGroup(0, topCount, 0);
  geometry.addGroup(topCount, underCount, 1);
  geometry.addGroup(topCount + underCount, faces.length - topCount - underCount, 2);
  geometry.computeVertexNormals();
  return geometry;
}
