import type { Picture } from "./pictureOf";

/** Share of the squares that differ between two pictures of one size; 1 when the sizes differ. */
export function shareChanged(one: Picture, other: Picture): number {
  if (one.squares.length !== other.squares.length) return 1;
  return one.squares.filter((sum, index) => sum !== other.squares[index]).length / one.squares.length;
}
