import type { Vec2 } from "@/bending/geometry/vec2";
import { clipToBox, type Bounds } from "./clipToBox";
import type { PictureLabel, PictureShape, StepPicture } from "./pictureShape";

/** To 0.01, and never -0 (JSON has none). */
const round = (value: number): number => Math.round(value * 100) / 100 + 0;
const roundPoint = ([x, y]: Vec2): Vec2 => [round(x), round(y)];

/** Cuts a drawing to its box and rounds it to 0.01 (it is stored with the sheet). Open lines are left whole. */
export function finishPicture(shapes: readonly PictureShape[], labels: readonly PictureLabel[], bounds: Bounds, lettering: number): StepPicture {
  const [left, top, right, bottom] = bounds;
  const cut = shapes.flatMap((shape): PictureShape[] => {
    const points = shape.closed ? clipToBox(shape.points, bounds) : shape.points;
    if (points.length < 2) return [];
    const holes = shape.holes?.map((hole) => clipToBox(hole, bounds).map(roundPoint)).filter((hole) => hole.length > 2);
    return [{ kind: shape.kind, closed: shape.closed, points: points.map(roundPoint), ...(holes?.length ? { holes } : {}) }];
  });
  return {
    box: [round(left), round(top), round(right - left), round(bottom - top)],
    shapes: cut,
    labels: labels.map((label) => ({ ...label, at: roundPoint(label.at) })),
    lettering: round(lettering),
  };
}
