import type { Frame } from "../geometry/frame";
import type { Vec3 } from "../geometry/vec3";
import type { Bounds } from "./half";

/** The box round points, each group placed by its frame. */
export function boundsOf(groups: readonly { readonly frame: Frame; readonly points: readonly Vec3[] }[]): Bounds {
  let [a0, a1, b0, b1, z0, z1] = [Infinity, -Infinity, Infinity, -Infinity, Infinity, -Infinity];
  for (const { frame: { x, y, z, o }, points } of groups) {
    for (const p of points) {
      const a = o[0] + x[0] * p[0] + y[0] * p[1] + z[0] * p[2];
      const b = o[1] + x[1] * p[0] + y[1] * p[1] + z[1] * p[2];
      const c = o[2] + x[2] * p[0] + y[2] * p[1] + z[2] * p[2];
      if (a < a0) a0 = a;
      if (a > a1) a1 = a;
      if (b < b0) b0 = b;
      if (b > b1) b1 = b;
      if (c < z0) z0 = c;
      if (c > z1) z1 = c;
    }
  }
  return { a: [a0, a1], b: [b0, b1], z: [z0, z1] };
}
