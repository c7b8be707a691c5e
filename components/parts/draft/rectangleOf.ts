import type { Vec2 } from "@/bending/geometry/vec2";

/** Corners of an upright rectangle, counter-clockwise from its lower left one. */
export const rectangleOf = (x: number, y: number, width: number, height: number): readonly Vec2[] => [[x, y], [x + width, y], [x + width, y + height], [x, y + height]];
