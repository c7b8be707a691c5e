import { SOLID_MATCH_MM, SOLID_PARALLEL_RAD } from "../../core/tolerance";
import { crossProduct } from "../../geometry/crossProduct";
import { difference } from "../../geometry/difference";
import { dotProduct } from "../../geometry/dotProduct";
import { unitVector } from "../../geometry/unitVector";
import type { Joint, JointSide } from "./joint";
import type { Solid } from "./solid";
import type { SolidTopology } from "./solidTopology";

/** Bends without inside radius: plates whose inner faces meet in a straight hollow edge; outside round or sharp. */
export function findSharpJoints(solid: Solid, topology: SolidTopology, other: ReadonlyMap<number, number>, thickness: number): readonly Joint[] {
  return solid.edges.flatMap((edge, number): Joint[] => {
    const [a, b] = topology.facesOf[number] ?? [];
    const [p, q] = [solid.vertices[edge.from], solid.vertices[edge.to]];
    const [outerA, outerB] = [other.get(a ?? -1), other.get(b ?? -1)];
    if (edge.curve.kind !== "line" || a === undefined || b === undefined || !p || !q || outerA === undefined || outerB === undefined || outerA === b) return [];
    const [m, n] = [solid.faces[a]?.surface, solid.faces[b]?.surface];
    const run = topology.around[a]?.find((entry) => entry.edge === number);
    const axis = unitVector(run?.forward ? difference(q, p) : difference(p, q));
    if (m?.kind !== "plane" || n?.kind !== "plane" || !run || !axis) return [];
    // The material of face a lies to the left of its loop: when that way leads up from face b, the edge is hollow.
    if (dotProduct(crossProduct(m.normal, axis), n.normal) <= SOLID_PARALLEL_RAD) return [];
    const angle = Math.acos(Math.max(-1, Math.min(1, dotProduct(m.normal, n.normal))));
    if (angle < SOLID_PARALLEL_RAD) return [];
    const outside = roundOutside(solid, topology, outerA, outerB, thickness) ?? sharpOutside(topology, outerA, outerB);
    if (!outside) return [];
    return [{
      axis, angle, insideRadius: 0, inner: [{ face: a, edges: [number] }, { face: b, edges: [number] }], outer: outside.sides, faces: outside.faces,
      overrun: outside.faces.length > 0 ? 0 : thickness * Math.tan(angle / 2),
    }];
  });
}

interface Outside {
  readonly sides: readonly [JointSide, JointSide];
  readonly faces: readonly number[];
}

const edgesBetween = ({ around, facesOf }: SolidTopology, a: number, b: number): readonly number[] =>
  (around[a] ?? []).flatMap(({ edge }) => (facesOf[edge]?.includes(b) ? [edge] : []));

function sharpOutside(topology: SolidTopology, a: number, b: number): Outside | null {
  const edges = edgesBetween(topology, a, b);
  return edges.length > 0 ? { sides: [{ face: a, edges }, { face: b, edges }], faces: [] } : null;
}

/** A round face of one thickness radius between the two outer faces. */
function roundOutside(solid: Solid, topology: SolidTopology, a: number, b: number, thickness: number): Outside | null {
  for (const [face, { surface }] of solid.faces.entries()) {
    if (surface.kind !== "cylinder" || !surface.convex || Math.abs(surface.radius - thickness) > SOLID_MATCH_MM) continue;
    const [onA, onB] = [edgesBetween(topology, a, face), edgesBetween(topology, b, face)];
    if (onA.length > 0 && onB.length > 0) return { sides: [{ face: a, edges: onA }, { face: b, edges: onB }], faces: [face] };
  }
  return null;
}
