import type { Frame } from "@/bending/geometry/frame";
import { applyFrame } from "@/bending/geometry/applyFrame";
import type { Vec3 } from "@/bending/geometry/vec3";
import { bendArc } from "@/bending/part/bendArc";
import { bendDirections } from "@/bending/part/bendDirections";
import type { Bend } from "@/bending/part/partModel";
import { pointOnBendArc } from "@/bending/part/pointOnBendArc";

/** A piece of sheet with plane lower and upper faces, each convex, corner above corner. */
export interface SheetPrism {
  readonly lower: readonly Vec3[];
  readonly upper: readonly Vec3[];
  readonly face: number | null;
  readonly bend: number | null;
}

/**
 * The bend zone at an angle, as `count` slabs across the bend, placed by the frame of the parent face. For drawing:
 * corners lie on the true arcs. At angle 0 the zone is one flat slab.
 */
export function bendPrisms(bend: Bend, bendIndex: number, thickness: number, angle: number, parent: Frame, count: number): readonly SheetPrism[] {
  const slabs = angle < 1e-6 ? 1 : count;
  const corner = (v: number, end: boolean, z: number): Vec3 => applyFrame(parent, zonePoint(bend, thickness, angle, v, end, z));
  return Array.from({ length: slabs }, (_, i) => {
    const [near, far] = [i / slabs, (i + 1) / slabs];
    const ring = (z: number): readonly Vec3[] => [corner(near, false, z), corner(far, false, z), corner(far, true, z), corner(near, true, z)];
    return { lower: ring(0), upper: ring(thickness), face: null, bend: bendIndex };
  });
}

/** A point of the bent zone in the parent's sheet frame: `v` from the parent's tangent (0) to the child's (1). */
export function zonePoint(bend: Bend, thickness: number, angle: number, v: number, end: boolean, z: number): Vec3 {
  const [parentStart, childStart, childEnd, parentEnd] = bend.zone;
  const [near, far] = end ? [parentEnd, childEnd] : [parentStart, childStart];
  const { along, outward } = bendDirections(bend);
  const arc = bendArc({ thickness }, bend, angle);
  const [away, height] = pointOnBendArc(arc, v, arc.sense * (arc.neutralHeight - z));
  const shift = ((far[0] - near[0]) * along[0] + (far[1] - near[1]) * along[1]) * v;
  return [near[0] + along[0] * shift + outward[0] * away, near[1] + along[1] * shift + outward[1] * away, height];
}
