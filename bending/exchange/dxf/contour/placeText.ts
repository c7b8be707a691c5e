import type { Vec2 } from "../../../geometry/vec2";

const short = (value: number): string => String(Number(value.toFixed(2)) + 0);

/** A place in the drawing as a person looks it up: "12.5, -40". */
export const placeText = (point: Vec2): string => `${short(point[0])}, ${short(point[1])}`;
