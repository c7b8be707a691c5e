import type { Shape } from "./convexPiece";

/** A shape with the box round it, the margin included: left, right, bottom, top. */
export interface PlacedShape {
  readonly pieces: Shape;
  readonly box: readonly [number, number, number, number];
}

export function placedShape(pieces: Shape): PlacedShape {
  const box: [number, number, number, number] = [Infinity, -Infinity, Infinity, -Infinity];
  for (const { box: own } of pieces) {
    box[0] = Math.min(box[0], own[0]);
    box[1] = Math.max(box[1], own[1]);
    box[2] = Math.min(box[2], own[2]);
    box[3] = Math.max(box[3], own[3]);
  }
  return { pieces, box };
}
