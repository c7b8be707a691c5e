import { ExtrudeGeometry, Path, Shape, Vector2, type BufferGeometry } from "three";
import type { FlatRegion } from "@/bending/part/partModel";

/** Groups: 0 the top, 1 the underside, 2 the cut edges. In the unfolded sheet's coordinates. */
export function faceGeometry(face: FlatRegion, thickness: number): BufferGeometry {
  const shape = new Shape(face.outline.map(([x, y]) => new Vector2(x, y)));
  shape.holes = face.holes.map((hole) => new Path(hole.map(([x, y]) => new Vector2(x, y))));
  const geometry = new ExtrudeGeometry(shape, { depth: thickness, bevelEnabled: false, steps: 1 });
  const [lids, sides] = geometry.groups;
  geometry.clearGroups();
  const half = (lids?.count ?? 0) / 2;
  geometry.addGroup(0, half, 1);
  geometry.addGroup(half, half, 0);
  geometry.addGroup(sides?.start ?? 0, sides?.count ?? 0, 2);
  return geometry;
}
