import { composeFrames } from "../geometry/composeFrames";
import type { Frame } from "../geometry/frame";
import { invertFrame } from "../geometry/invertFrame";
import { foldFrames } from "../part/foldFrames";
import type { PartModel } from "../part/partModel";

/** The frames of all faces in the finished part, from their place in the sheet to that of the given face. */
export function seenFrom(part: PartModel, face: number): readonly Frame[] {
  const frames = foldFrames(part, part.bends.map(({ angle }) => angle));
  const own = frames[face];
  return own ? frames.map((frame) => composeFrames(invertFrame(own), frame)) : frames;
}
