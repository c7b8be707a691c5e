import { applyFrame } from "@/bending/geometry/applyFrame";
import type { Frame } from "@/bending/geometry/frame";
import type { Vec2 } from "@/bending/geometry/vec2";
import type { Vec3 } from "@/bending/geometry/vec3";
import type { PartModel } from "@/bending/part/partModel";
import { convexHull } from "@/bending/geometry/convexHull";

/** A face seen along one axis: its outline and holes, or the edge-on slab. `depth` orders faces along the line of sight. */
export interface FaceOutline {
  readonly face: number;
  readonly points: readonly Vec2[];
  readonly holes: readonly (readonly Vec2[])[];
  readonly depth: number;
  readonly edgeOn: boolean;
}

/** Looks at every face of the folded sheet along `axis` (0 x, 1 y, 2 z); `look` turns a point into the drawing's plane. */
export function faceOutlines(part: PartModel, frames: readonly Frame[], axis: 0 | 1 | 2, look: (point: Vec3) => Vec2): readonly FaceOutline[] {
  return part.faces.flatMap((face, index) => {
    const frame = frames[index];
    if (!frame) return [];
    const at = (z: number) => ([x, y]: Vec2): Vec3 => applyFrame(frame, [x, y, z]);
    const upper = face.outline.map(at(part.thickness));
    const lower = face.outline.map(at(0));
    const edgeOn = Math.abs(frame.z[axis]) < 0.05;
    const depth = upper.reduce((sum, point) => sum + point[axis], 0) / Math.max(1, upper.length);
    return [{
      face: index,
      points: edgeOn ? convexHull([...upper, ...lower].map(look)) : upper.map(look),
      holes: edgeOn ? [] : face.holes.map((hole) => hole.map(at(part.thickness)).map(look)),
      depth,
      edgeOn,
    }];
  });
}
