import { SAME_POINT_MM } from "../../core/tolerance";
import { dotProduct } from "../../geometry/dotProduct";
import { difference } from "../../geometry/difference";
import type { Frame } from "../../geometry/frame";
import type { Vec2 } from "../../geometry/vec2";
import type { Vec3 } from "../../geometry/vec3";
import type { OutlineVertex } from "./recognisedPart";
import type { Loop, Solid } from "./solid";

/** A loop of a plane face in the plane's own coordinates. */
export interface FlatLoop {
  readonly vertices: readonly OutlineVertex[];
  /** For each vertex the solid's edge that starts there. */
  readonly edges: readonly number[];
  /** Curves other than lines and circles are in it, as chords. */
  readonly chords: boolean;
}

/** Lays a loop into the plane of `frame`: circles become bulges (tangent of a quarter of the arc's angle), other curves chords. */
export function flattenLoop(solid: Solid, loop: Loop, frame: Frame): FlatLoop {
  const at = (p: Vec3): Vec2 => {
    const d = difference(p, frame.o);
    return [dotProduct(d, frame.x), dotProduct(d, frame.y)];
  };
  const vertices: OutlineVertex[] = [];
  const edges: number[] = [];
  let chords = false;
  for (const { edge: number, forward } of loop) {
    const edge = solid.edges[number];
    const [a, b] = [solid.vertices[edge?.from ?? -1], solid.vertices[edge?.to ?? -1]];
    if (!edge || !a || !b) continue;
    const [from, to] = forward ? [at(a), at(b)] : [at(b), at(a)];
    const push = (p: Vec2, bulge: number) => {
      vertices.push([p[0], p[1], bulge]);
      edges.push(number);
    };
    const { curve } = edge;
    if (curve.kind === "circle") {
      const middle = at(curve.middle);
      if (edge.from === edge.to) {
        // A whole circle, in two halves; counter-clockwise in the plane when its axis points with z along the way it runs.
        const half = (dotProduct(curve.axis, frame.z) > 0) === forward ? 1 : -1;
        push(from, half);
        push(middle, half);
      } else push(from, bulgeOf(from, middle, to));
    } else if (curve.kind === "other") {
      chords = true;
      const between = (forward ? curve.between : [...curve.between].reverse()).map(at);
      for (const p of [from, ...between]) push(p, 0);
    } else if (Math.hypot(to[0] - from[0], to[1] - from[1]) > SAME_POINT_MM) push(from, 0);
  }
  return { vertices, edges, chords };
}

/** Twice the height of the arc over its chord: positive when the arc's middle lies on the chord's right, as the arc then runs counter-clockwise. */
function bulgeOf(from: Vec2, middle: Vec2, to: Vec2): number {
  const [dx, dy] = [to[0] - from[0], to[1] - from[1]];
  const chord = Math.hypot(dx, dy);
  if (chord === 0) return 0;
  const right = ((middle[0] - from[0]) * dy - (middle[1] - from[1]) * dx) / chord;
  return (2 * right) / chord;
}
