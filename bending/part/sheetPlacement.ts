import type { FlatPoint, Vec2 } from "../geometry/vec2";

/** Where a face's local coordinates lie in the unfolded sheet: p -> origin + along x + upward y; a rotation. */
export interface SheetPlacement {
  readonly origin: Vec2;
  readonly along: Vec2;
}

export function placeOnSheet({ origin, along }: SheetPlacement, [x, y]: Vec2): FlatPoint {
  return [origin[0] + along[0] * x - along[1] * y, origin[1] + along[1] * x + along[0] * y];
}

/** Turns a local direction into the sheet's. */
export function turnOnSheet({ along }: SheetPlacement, [x, y]: Vec2): Vec2 {
  return [along[0] * x - along[1] * y, along[1] * x + along[0] * y];
}
