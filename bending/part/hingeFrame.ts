import type { Vec3 } from "../geometry/vec3";
import { pointOnBendArc } from "./pointOnBendArc";
import type { ResolvedBend } from "./resolveBend";

/** A flange's plane as it stands folded about one edge of the face that carries it, and about lines along that edge. */
export interface HingeFrame {
  /** Bottom surface, where the plane part begins, at the edge's first corner. */
  readonly origin: Vec3;
  /** Along the edge, away from the bend, and from the bottom to the top. */
  readonly along: Vec3;
  readonly away: Vec3;
  readonly normal: Vec3;
}

/** The plane of a flange whose bend begins `distance` from where the parent's plane part does; `angle` as formed. */
export function hingeFrame(parent: HingeFrame, distance: number, bend: Pick<ResolvedBend, "direction" | "k" | "allowance">, angle: number, thickness: number): HingeFrame {
  const sense = bend.direction === "up" ? 1 : -1;
  const neutralHeight = thickness * (bend.direction === "up" ? 1 - bend.k : bend.k);
  const [u, z] = pointOnBendArc({ angle, sense, allowance: bend.allowance, neutralHeight }, 1, 0);
  const [cos, sin] = [Math.cos(angle), sense * Math.sin(angle)];
  const away = sum(parent.away, cos, parent.normal, sin);
  const normal = sum(parent.normal, cos, parent.away, -sin);
  const neutral = sum(parent.origin, 1, sum(parent.away, distance + u, parent.normal, z), 1);
  return { origin: sum(neutral, 1, normal, -neutralHeight), along: parent.along, away, normal };
}

const sum = (a: Vec3, s: number, b: Vec3, t: number): Vec3 => [a[0] * s + b[0] * t, a[1] * s + b[1] * t, a[2] * s + b[2] * t];
