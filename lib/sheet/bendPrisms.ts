import type { Frame } from "@/bending/geometry/frame";
import { applyFrame } from "@/bending/geometry/applyFrame";
import type { Vec3 } from "@/bending/geometry/vec3";
import type { Bend } from "@/bending/part/partModel";

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
  const near = end ? parentEnd : parentStart;
  const far = end ? childEnd : childStart;
  const [lineStart, lineEnd] = bend.line;
  const length = Math.hypot(lineEnd[0] - lineStart[0], lineEnd[1] - lineStart[1]);
  const along = [(lineEnd[0] - lineStart[0]) / length, (lineEnd[1] - lineStart[1]) / length] as const;
  const across = [along[1], -along[0]] as const;
  const flat = [near[0] + (far[0] - near[0]) * v, near[1] + (far[1] - near[1]) * v] as const;
  if (angle < 1e-6) return [flat[0], flat[1], z];
  const width = (far[0] - near[0]) * across[0] + (far[1] - near[1]) * across[1];
  const radius = width / angle;
  const up = bend.direction === "up";
  const neutral = up ? thickness * (1 - bend.k) : thickness * bend.k;
  const centre = up ? neutral + radius : neutral - radius;
  const reach = up ? centre - z : z - centre;
  const shift = reach * Math.sin(angle * v) - width * v;
  const height = up ? centre - reach * Math.cos(angle * v) : centre + reach * Math.cos(angle * v);
  return [flat[0] + across[0] * shift, flat[1] + across[1] * shift, height];
}
