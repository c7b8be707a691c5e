import { invariant } from "../core/invariant";
import { composeFrames } from "../geometry/composeFrames";
import type { Frame } from "../geometry/frame";
import { identityFrame } from "../geometry/identityFrame";
import { bendFrame } from "./bendFrame";
import type { FormedAngles, PartModel } from "./partModel";

/**
 * For each face the frame from coordinates of the unfolded sheet (x, y; z = 0..thickness) to the part frame,
 * in which the base lies as it was drawn. `angles[i]` is how far bend i is formed.
 */
export function foldFrames(part: PartModel, angles: FormedAngles): readonly Frame[] {
  const frames: Frame[] = [identityFrame];
  part.bends.forEach((bend, i) => {
    const parent = frames[bend.parent];
    invariant(parent && bend.child === frames.length, "a parent stands before its children");
    frames.push(composeFrames(parent, bendFrame(part, bend, angles[i] ?? 0)));
  });
  return frames;
}
