import type { Vec2 } from "@/bending/geometry/vec2";
import type { PictureShape } from "./pictureShape";

/** A straight arrow with a filled head of the given size. */
export function arrowShapes(from: Vec2, to: Vec2, head: number): readonly PictureShape[] {
  const length = Math.hypot(to[0] - from[0], to[1] - from[1]) || 1;
  const [dx, dy] = [(to[0] - from[0]) / length, (to[1] - from[1]) / length];
  const neck: Vec2 = [to[0] - dx * head, to[1] - dy * head];
  return [
    { kind: "arrow", closed: false, points: [from, neck] },
    { kind: "arrow", closed: true, points: [to, [neck[0] - dy * head * 0.45, neck[1] + dx * head * 0.45], [neck[0] + dy * head * 0.45, neck[1] - dx * head * 0.45]] },
  ];
}
