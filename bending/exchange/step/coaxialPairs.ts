import { SOLID_MATCH_MM, SOLID_PARALLEL_RAD } from "../../core/tolerance";
import { crossProduct } from "../../geometry/crossProduct";
import { difference } from "../../geometry/difference";
import { dotProduct } from "../../geometry/dotProduct";
import type { Interval } from "../../geometry/interval";
import type { CylinderSurface, Solid } from "./solid";

/** A hollow and a round face about one axis with material between, side by side along it. */
export interface CoaxialPair {
  readonly inner: number;
  readonly outer: number;
  readonly distance: number;
  /** Of the inner face. */
  readonly area: number;
}

export function coaxialPairs(solid: Solid): readonly CoaxialPair[] {
  const cylinders = solid.faces.flatMap(({ surface, area }, face) => (surface.kind === "cylinder" ? [{ face, area, surface }] : []));
  return cylinders.filter(({ surface }) => !surface.convex).flatMap((inner) => cylinders
    .filter(({ face, surface }) => surface.convex && surface.radius - inner.surface.radius > SOLID_MATCH_MM && sameAxis(surface, inner.surface)
      && overlap(extent(solid, face, inner.surface), extent(solid, inner.face, inner.surface)) > SOLID_MATCH_MM)
    .map((outer) => ({ inner: inner.face, outer: outer.face, distance: outer.surface.radius - inner.surface.radius, area: inner.area })));
}

function sameAxis(a: CylinderSurface, b: CylinderSurface): boolean {
  const apart = crossProduct(difference(b.point, a.point), a.axis);
  return Math.abs(dotProduct(a.axis, b.axis)) >= Math.cos(SOLID_PARALLEL_RAD) && Math.hypot(...apart) <= SOLID_MATCH_MM;
}

function extent(solid: Solid, face: number, { point, axis }: CylinderSurface): Interval {
  const along = (solid.faces[face]?.loops ?? []).flat().flatMap(({ edge }) => [solid.edges[edge]?.from, solid.edges[edge]?.to])
    .flatMap((vertex) => {
      const p = solid.vertices[vertex ?? -1];
      return p ? [dotProduct(difference(p, point), axis)] : [];
    });
  return [Math.min(...along), Math.max(...along)];
}

const overlap = (a: Interval, b: Interval) => Math.min(a[1], b[1]) - Math.max(a[0], b[0]);
