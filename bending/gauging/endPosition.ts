import { invariant } from "../core/invariant";
import { applyFrame } from "../geometry/applyFrame";
import { dotProduct } from "../geometry/dotProduct";
import type { Frame } from "../geometry/frame";
import type { Vec3 } from "../geometry/vec3";
import type { EndPoint } from "./endPoint";

/** How far along `direction` an end lies; `frames` lay every face out, `way` is +1 where a dimension ends, -1 where it begins. */
export function endPosition(frames: readonly Frame[], { face, point, beyond }: EndPoint, direction: Vec3, way: 1 | -1): number {
  const frame = frames[face];
  invariant(frame, "a dimension ends at a face of the part");
  return dotProduct(direction, applyFrame(frame, point)) + way * beyond;
}
