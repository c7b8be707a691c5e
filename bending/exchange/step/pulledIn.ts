import type { OutlineVertex } from "./recognisedPart";

/** A counter-clockwise outline with one straight edge moved inwards by a distance, its two corners with it. */
export function pulledIn(outline: readonly OutlineVertex[], edge: number, by: number): readonly OutlineVertex[] {
  const next = (edge + 1) % outline.length;
  const [from, to] = [outline[edge], outline[next]];
  if (!from || !to) return outline;
  const length = Math.hypot(to[0] - from[0], to[1] - from[1]);
  const [nx, ny] = [-((to[1] - from[1]) / length) * by, ((to[0] - from[0]) / length) * by];
  return outline.map((vertex, i): OutlineVertex => (i === edge || i === next ? [vertex[0] + nx, vertex[1] + ny, vertex[2]] : vertex));
}
