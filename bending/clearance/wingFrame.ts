import type { Frame } from "../geometry/frame";
import type { Vec3 } from "../geometry/vec3";
import type { FacePath } from "./facePath";

/**
 * From the unfolded sheet, as it lies with the wing, to the wing's own coordinates: a away from the bend, from the tangent on
 * the wing's outside surface; b from the outside surface inwards; z along the bed from the middle of the hit.
 */
export function wingFrame({ line: { bend, across, along, middle }, wingIsParent }: FacePath, thickness: number): Frame {
  const [start] = bend.line;
  const sign = wingIsParent ? -1 : 1;
  const up = bend.direction === "up";
  const axis = (i: 0 | 1): Vec3 => [sign * across[i], 0, along[i]];
  const [x, y] = [axis(0), axis(1)];
  return { x, y, z: [0, up ? 1 : -1, 0], o: [-sign * (across[0] * start[0] + across[1] * start[1]) - bend.allowance / 2, up ? 0 : thickness, -middle] };
}
