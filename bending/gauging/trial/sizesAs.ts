import type { PartModel } from "../../part/partModel";
import { endPoint } from "../endPoint";
import { endPosition } from "../endPosition";
import type { PartDimension } from "../partDimension";
import { seenFrom } from "../seenFrom";

/** The dimensions of a part as bent, folded again: between their first beginning and their first end. */
export function sizesAs(drawn: PartModel, bent: PartModel, dimensions: readonly PartDimension[]): readonly number[] {
  return dimensions.map(({ face, direction, from: [from], to: [to] }) => {
    if (!from || !to) return NaN;
    const frames = seenFrom(bent, face);
    const at = (end: typeof from, way: 1 | -1) => endPosition(frames, endPoint(drawn, end, end.at === "point" ? null : bent.bends[end.bend] ?? null), direction, way);
    return at(to, 1) - at(from, -1);
  });
}
