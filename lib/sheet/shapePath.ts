import type { PictureShape } from "./pictureShape";

/** The SVG path of a shape, its holes after its outline (fill with even-odd). */
export function shapePath({ points, closed, holes = [] }: PictureShape): string {
  const loop = (corners: PictureShape["points"], end: string): string => corners.map(([x, y], i) => `${i === 0 ? "M" : "L"}${x} ${y}`).join("") + end;
  return loop(points, closed ? "Z" : "") + holes.map((hole) => loop(hole, "Z")).join("");
}
