import { MEANT_CONTACT_MM } from "../core/tolerance";
import type { Frame } from "../geometry/frame";
import type { Vec3 } from "../geometry/vec3";
import { sectionOf } from "./sectionOf";
import { boundsOf } from "./boundsOf";
import type { Prism } from "./prism";

/** A plate between two sides with the same corners in the same order, placed in its wing's coordinates by `frame`. */
export function prismIn(of: Prism["of"], thickness: number, frame: Frame, one: readonly Vec3[], other: readonly Vec3[]): Prism {
  const { x, y, z, o } = frame;
  const points = new Float64Array(6 * one.length);
  let at = 0;
  for (const side of [one, other]) {
    for (const p of side) {
      for (let j = 0; j < 3; j++) points[at++] = (o[j] as number) + (x[j] as number) * p[0] + (y[j] as number) * p[1] + (z[j] as number) * p[2];
    }
  }
  const bounds = boundsOf([{ frame, points: [...one, ...other] }]);
  const lies = bounds.b[0] < -MEANT_CONTACT_MM ? "outside" : bounds.b[1] > thickness + MEANT_CONTACT_MM ? "inside" : "plane";
  return { of, count: one.length, points, section: sectionOf(points, bounds.z), lies, ...bounds };
}
