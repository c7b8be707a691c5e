import { invariant } from "../core/invariant";
import { applyFrame } from "../geometry/applyFrame";
import type { PartModel } from "../part/partModel";
import type { Hit } from "../clearance/hit";
import type { Touch } from "./gaugedStep";
import { levelFrames } from "./levelFrames";

/** How far behind the bend line the gauge finds the part, mm: at a slanted edge, where it crosses the middle of the stroke. */
export function gaugedDepth(part: PartModel, hit: Hit, touch: Touch): number {
  const frame = levelFrames(part, hit)[touch.face];
  invariant(frame, "the fingers touch a face of the part");
  const [x, , z] = applyFrame(frame, touch.point);
  return x - touch.slope * z;
}
