import type { PartModel } from "../part/partModel";
import type { Frame } from "../geometry/frame";
import { endPosition } from "./endPosition";
import type { PartDimension } from "./partDimension";
import { seenFrom } from "./seenFrom";

/** For every dimension the sizes between each of its beginnings and each of its ends, in the part as bent; `drawn` is the part as it should be. */
export function dimensionSizes(drawn: PartModel, bent: PartModel, dimensions: readonly PartDimension[]): readonly (readonly number[])[] {
  const seen = new Map<number, readonly Frame[]>();
  return dimensions.map(({ face, direction, from, to }) => {
    const frames = seen.get(face) ?? seenFrom(bent, face);
    seen.set(face, frames);
    const ends = to.map((end) => endPosition(drawn, bent, frames, end, direction, 1));
    return from.flatMap((start) => {
      const begins = endPosition(drawn, bent, frames, start, direction, -1);
      return ends.map((end) => end - begins);
    });
  });
}
