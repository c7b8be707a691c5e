import { SOLID_MATCH_MM, SOLID_PARALLEL_RAD } from "../../core/tolerance";
import { crossProduct } from "../../geometry/crossProduct";
import { difference } from "../../geometry/difference";
import { dotProduct } from "../../geometry/dotProduct";
import { moved } from "../../geometry/moved";
import { unitVector } from "../../geometry/unitVector";
import type { Vec3 } from "../../geometry/vec3";
import { coaxialPairs } from "./coaxialPairs";
import { findSharpJoints } from "./findSharpJoints";
import { mergedJoints } from "./mergedJoints";
import type { Joint, JointSide } from "./joint";
import type { CylinderSurface, Solid } from "./solid";
import type { SolidTopology } from "./solidTopology";

/** A plane face and a round one meet smoothly when their normals differ by less; small radii make this coarser than other directions. */
const TANGENT_RAD = 5 * SOLID_PARALLEL_RAD;

/** Every place where two plates are joined by a pair of coaxial round faces a thickness apart, or by a sharp inner edge. */
export function findJoints(solid: Solid, topology: SolidTopology, other: ReadonlyMap<number, number>, thickness: number): readonly Joint[] {
  const round = coaxialPairs(solid).flatMap(({ inner, outer, distance }): Joint[] => {
    const surface = solid.faces[inner]?.surface;
    if (surface?.kind !== "cylinder" || Math.abs(distance - thickness) > SOLID_MATCH_MM) return [];
    const inside = sidesOf(solid, topology, inner, surface, other);
    const outside = sidesOf(solid, topology, outer, surface, other);
    const [a, b] = inside;
    if (inside.length !== 2 || !a || !b) return [];
    const facing = (side: JointSide) => outside.find(({ face }) => face === other.get(side.face));
    const [c, d] = [facing(a), facing(b)];
    if (!c || !d) return [];
    const angle = Math.acos(Math.max(-1, Math.min(1, dotProduct(a.radial, b.radial))));
    if (angle < SOLID_PARALLEL_RAD) return [];
    return [{ axis: surface.axis, angle, insideRadius: surface.radius, inner: [a, b], outer: [c, d], faces: [inner, outer], overrun: 0 }];
  });
  return mergedJoints([...round, ...findSharpJoints(solid, topology, other, thickness)]);
}

interface TangentSide extends JointSide {
  /** From the axis to where the plane face touches the round one. */
  readonly radial: Vec3;
}

/** The plate faces that run tangentially into a round face along straight edges. */
function sidesOf(solid: Solid, topology: SolidTopology, face: number, { point, axis }: CylinderSurface, other: ReadonlyMap<number, number>): readonly TangentSide[] {
  const sides = new Map<number, { radial: Vec3; edges: number[] }>();
  for (const { edge: number } of topology.around[face] ?? []) {
    const edge = solid.edges[number];
    const [p, q] = [solid.vertices[edge?.from ?? -1], solid.vertices[edge?.to ?? -1]];
    const neighbour = topology.facesOf[number]?.find((candidate) => candidate !== face);
    const surface = solid.faces[neighbour ?? -1]?.surface;
    if (edge?.curve.kind !== "line" || !p || !q || neighbour === undefined || surface?.kind !== "plane" || !other.has(neighbour)) continue;
    const along = unitVector(difference(q, p));
    const foot = difference(p, moved(point, axis, dotProduct(difference(p, point), axis)));
    const radial = unitVector(foot);
    if (!along || !radial || Math.hypot(...crossProduct(along, axis)) > SOLID_PARALLEL_RAD) continue;
    if (Math.hypot(...crossProduct(radial, surface.normal)) > TANGENT_RAD) continue;
    const known = sides.get(neighbour);
    if (known) known.edges.push(number);
    else sides.set(neighbour, { radial, edges: [number] });
  }
  return [...sides].map(([plate, { radial, edges }]) => ({ face: plate, radial, edges }));
}
