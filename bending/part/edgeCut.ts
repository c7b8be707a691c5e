import type { Vec2 } from "../geometry/vec2";
import type { DrawnEdge } from "./drawnFace";

/** What a bend takes off the drawn face that it is on: a strip along the edge, down to where the bend begins. */
export interface EdgeCut {
  readonly edge: DrawnEdge;
  /** Setback as measured on this face. */
  readonly depth: number;
  /** Insets from the edge's ends, as declared. */
  readonly start: number;
  readonly end: number;
  readonly relief: { readonly kind: "rectangular" | "round" | "tear"; readonly width: number; readonly depth: number } | null;
}

export interface EdgeAxes {
  readonly origin: Vec2;
  /** Along the edge, counter-clockwise round the face. */
  readonly along: Vec2;
  /** Into the face. */
  readonly inward: Vec2;
  readonly length: number;
}

export function edgeAxes({ from, to }: DrawnEdge): EdgeAxes {
  const length = Math.hypot(to[0] - from[0], to[1] - from[1]);
  const along: Vec2 = [(to[0] - from[0]) / length, (to[1] - from[1]) / length];
  return { origin: from, along, inward: [-along[1], along[0]], length };
}

/** [distance along the edge, depth into the face]. */
export function onEdge(axes: EdgeAxes, p: Vec2): Vec2 {
  const [dx, dy] = [p[0] - axes.origin[0], p[1] - axes.origin[1]];
  return [dx * axes.along[0] + dy * axes.along[1], dx * axes.inward[0] + dy * axes.inward[1]];
}

export function fromEdge(axes: EdgeAxes, [along, depth]: Vec2): Vec2 {
  return [
    axes.origin[0] + axes.along[0] * along + axes.inward[0] * depth,
    axes.origin[1] + axes.along[1] * along + axes.inward[1] * depth,
  ];
}
