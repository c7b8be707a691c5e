import { invariant } from "../core/invariant";
import type { Vec3 } from "../geometry/vec3";
import { bendArc } from "./bendArc";
import { bendDirections } from "./bendDirections";
import type { PartModel } from "./partModel";
import { pointOnBendArc } from "./pointOnBendArc";

/** Four corners: parent's side at start, child's side at start, child's side at end, parent's side at end. */
export type FacetQuad = readonly [Vec3, Vec3, Vec3, Vec3];

/** A convex plate with eight corners; corner i of `inside` and of `outside` are joined by an edge. */
export interface BendFacet {
  /** On the side of the bend's centre; corners on the inside arc (its chord). */
  readonly inside: FacetQuad;
  /** On the far side; tangent to the outside arc. */
  readonly outside: FacetQuad;
}

/**
 * The bend zone formed to `angle`, as `count` convex plates side by side, in the coordinates of the sheet as
 * it lies with the parent (apply the parent's frame of `foldFrames` to place them). The outside is
 * circumscribed and the inside is the chord, so the true arc lies within the plates.
 */
export function bendFacets(part: PartModel, bendIndex: number, angle: number, count: number): readonly BendFacet[] {
  const bend = part.bends[bendIndex];
  invariant(bend && count >= 1, "bendFacets: a bend of the part and at least one facet");
  const arc = bendArc(part, bend, angle);
  const { along: d, outward: n } = bendDirections(bend);
  const [parentStart, childStart, childEnd, parentEnd] = bend.zone;
  const from = parentStart[0] * d[0] + parentStart[1] * d[1];
  const alongLine = (p: readonly [number, number]) => p[0] * d[0] + p[1] * d[1] - from;
  const t = part.thickness;
  const half = angle / count / 2;
  // Outside radius x (1 / cos - 1), finite when flat.
  const outsideRadius = angle > 1e-9 ? bend.allowance / angle + (1 - bend.k) * t : 0;
  const outward = (1 - bend.k) * t + outsideRadius * (1 / Math.cos(half) - 1);
  const insideRadius = angle > 1e-9 ? bend.allowance / angle - bend.k * t : Infinity;
  const inward = -bend.k * t - Math.min(0, insideRadius);
  const corner = (f: number, offset: number, atStart: boolean): Vec3 => {
    const [u, z] = pointOnBendArc(arc, f, offset);
    const [p, c] = atStart ? [parentStart, childStart] : [parentEnd, childEnd];
    const a = alongLine(p) + (alongLine(c) - alongLine(p)) * f;
    return [parentStart[0] + d[0] * a + n[0] * u, parentStart[1] + d[1] * a + n[1] * u, z];
  };
  const quad = (i: number, offset: number): FacetQuad => [
    corner(i / count, offset, true), corner((i + 1) / count, offset, true),
    corner((i + 1) / count, offset, false), corner(i / count, offset, false),
  ];
  return Array.from({ length: count }, (_, i) => ({ inside: quad(i, inward), outside: quad(i, outward) }));
}
