import type { Vec3 } from "../geometry/vec3";
import type { Bend } from "../part/partModel";

/** Middle of a formed bend's arc, in the unfolded sheet as its parent lies in it. */
export function arcCentre(bend: Bend, thickness: number): Vec3 {
  const [x, y] = bend.zone[0];
  return [x, y, bend.direction === "up" ? thickness + bend.insideRadius : -bend.insideRadius];
}
