import type { ProfilePoint } from "../geometry/vec2";
import type { FlatteningSlot } from "./tool";
import { vDieProfile, type VDieShape } from "./vDieProfile";

/** A V over a slot that opens to the front, as on a two-stage hem die while it stands open. Counter-clockwise. */
export function hemDieProfile(shape: VDieShape, { floor, back, opening }: FlatteningSlot): readonly ProfilePoint[] {
  const front = -shape.bodyWidth / 2;
  const [ceiling, bottom] = [opening - floor, -floor];
  const slot: readonly ProfilePoint[] = [[front, ceiling], [back, ceiling], [back, bottom], [front, bottom]];
  const plain = vDieProfile(shape);
  const last = plain.length - 1;
  return [...plain.slice(0, last), ...slot, ...plain.slice(last)];
}
