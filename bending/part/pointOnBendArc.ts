import type { BendArc } from "./bendArc";

/**
 * [u, z] of a point of the bend zone: `along` of the way round (0 at the parent's tangent, 1 at the child's),
 * `outward` from the neutral line away from the centre of the bend (minus: towards it).
 */
export function pointOnBendArc(arc: BendArc, along: number, outward: number): readonly [number, number] {
  const turned = arc.angle * along;
  const length = arc.allowance * along;
  const [forward, rise] = Math.abs(turned) < 1e-6
    ? [length, (length * turned) / 2]
    : [(length * Math.sin(turned)) / turned, (length * (1 - Math.cos(turned))) / turned];
  return [
    forward + outward * Math.sin(turned),
    arc.neutralHeight + arc.sense * (rise - outward * Math.cos(turned)),
  ];
}
