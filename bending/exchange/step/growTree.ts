import { SOLID_MATCH_MM } from "../../core/tolerance";
import { crossProduct } from "../../geometry/crossProduct";
import { difference } from "../../geometry/difference";
import { dotProduct } from "../../geometry/dotProduct";
import type { Frame } from "../../geometry/frame";
import type { Interval } from "../../geometry/interval";
import { moved } from "../../geometry/moved";
import type { Vec3 } from "../../geometry/vec3";
import type { BendDirection } from "../../part/partDocument";
import type { Joint } from "./joint";
import { planeAxes } from "./planeAxes";
import type { Solid } from "./solid";
import type { SolidTopology } from "./solidTopology";

export interface GrownPlate {
  readonly top: number;
  readonly bottom: number;
  readonly frame: Frame;
}

export interface GrownBend {
  readonly parent: number;
  readonly child: number;
  readonly direction: BendDirection;
  readonly joint: Joint;
  /** Edges of the solid along the bend, on the top side of the parent and of the child; several where a cut-out parts them. */
  readonly parentEdges: readonly number[];
  readonly childEdges: readonly number[];
  /** The edges' outside corner is sharp on the top side: they stand this much too far out. */
  readonly overrun: number;
  /** From the start of the parent's edge, along it. */
  readonly start: number;
  readonly length: number;
  /** How much longer the longer of the two edges is than what they have in common. */
  readonly unequal: number;
}

export interface GrownTree {
  readonly plates: readonly GrownPlate[];
  readonly bends: readonly GrownBend[];
  /** Joints between plates that the tree holds already, by another way. */
  readonly closing: readonly Joint[];
}

/** The tree of plates that hangs on the base through joints, the base first, nearest first. `other` is the other side of each plate face. */
export function growTree(solid: Solid, topology: SolidTopology, other: ReadonlyMap<number, number>, joints: readonly Joint[], thickness: number, baseTop: number): GrownTree {
  const surface = solid.faces[baseTop]?.surface;
  const normal: Vec3 = surface?.kind === "plane" ? surface.normal : [0, 0, 1];
  const plates: GrownPlate[] = [{ top: baseTop, bottom: other.get(baseTop) ?? baseTop, frame: baseFrame(solid, topology, baseTop, normal, thickness) }];
  const bends: GrownBend[] = [];
  const closing: Joint[] = [];
  const used = new Set<Joint>();
  for (let parent = 0; parent < plates.length; parent += 1) {
    const plate = plates[parent];
    for (const joint of joints) {
      const place = plate && !used.has(joint) ? placeOf(joint, plate) : null;
      if (!plate || !place) continue;
      used.add(joint);
      const known = plates.some(({ top, bottom }) => top === place.childTop || bottom === place.childTop);
      const grown = known ? null : grow(solid, topology, plate, place, thickness);
      if (!grown) {
        closing.push(joint);
        continue;
      }
      bends.push({ ...grown.bend, parent, child: plates.length, direction: place.direction, joint });
      plates.push({ top: place.childTop, bottom: other.get(place.childTop) ?? place.childTop, frame: grown.frame });
    }
  }
  return { plates, bends, closing };
}

interface JointPlace {
  readonly direction: BendDirection;
  readonly childTop: number;
  readonly parentEdges: readonly number[];
  readonly childEdges: readonly number[];
  readonly overrun: number;
}

function placeOf(joint: Joint, { top }: GrownPlate): JointPlace | null {
  for (const direction of ["up", "down"] as const) {
    const sides = direction === "up" ? joint.inner : joint.outer;
    for (const [mine, its] of [[sides[0], sides[1]], [sides[1], sides[0]]] as const) {
      if (mine.face === top) return { direction, childTop: its.face, parentEdges: mine.edges, childEdges: its.edges, overrun: direction === "up" ? 0 : joint.overrun };
    }
  }
  return null;
}

function grow(solid: Solid, topology: SolidTopology, parent: GrownPlate, place: JointPlace, thickness: number): {
  readonly frame: Frame;
  readonly bend: Pick<GrownBend, "parentEdges" | "childEdges" | "overrun" | "start" | "length" | "unequal">;
} | null {
  const along = runOf(solid, topology, parent.top, place.parentEdges[0] ?? -1);
  const surface = solid.faces[place.childTop]?.surface;
  if (!along || surface?.kind !== "plane") return null;
  const span = (edges: readonly number[]): Interval => {
    const ends = edges.flatMap((edge) => [solid.edges[edge]?.from, solid.edges[edge]?.to]).map((vertex) => dotProduct(solid.vertices[vertex ?? -1] ?? [0, 0, 0], along));
    return [Math.min(...ends), Math.max(...ends)];
  };
  const [mine, its] = [span(place.parentEdges), span(place.childEdges)];
  if (Math.min(mine[1], its[1]) - Math.max(mine[0], its[0]) <= SOLID_MATCH_MM) return null;
  // Ends that are one by the solid's own exactness are one here, so that no step of a hair is left beside the bend.
  const one = (a: number, b: number) => Math.abs(a - b) <= SOLID_MATCH_MM;
  const first = one(mine[0], its[0]) ? mine[0] : Math.max(mine[0], its[0]);
  const common = (one(mine[1], its[1]) ? mine[1] : Math.min(mine[1], its[1])) - first;
  const onEdge = solid.vertices[solid.edges[place.childEdges[0] ?? -1]?.from ?? -1] ?? [0, 0, 0];
  const axes = planeAxes(surface.normal, onEdge, along);
  // At the bend's start, on the underside, and back from a sharp outside corner to where a round one would begin.
  const start = moved(moved(onEdge, axes.x, first - dotProduct(onEdge, along)), axes.y, -place.overrun);
  return {
    frame: { ...axes, o: moved(start, axes.z, -thickness) },
    bend: {
      parentEdges: place.parentEdges, childEdges: place.childEdges, overrun: place.overrun, start: first - mine[0], length: common,
      unequal: Math.max(mine[1] - mine[0], its[1] - its[0]) - common,
    },
  };
}

/** The direction in which a face's loop runs through an edge. */
function runOf(solid: Solid, topology: SolidTopology, face: number, edge: number): Vec3 | null {
  const run = topology.around[face]?.find((entry) => entry.edge === edge);
  const [p, q] = [solid.vertices[solid.edges[edge]?.from ?? -1], solid.vertices[solid.edges[edge]?.to ?? -1]];
  if (!run || !p || !q) return null;
  const d = difference(q, p);
  const length = Math.hypot(...d);
  const sense = run.forward ? 1 : -1;
  return length > 0 ? [(d[0] / length) * sense, (d[1] / length) * sense, (d[2] / length) * sense] : null;
}

/** x along the base's longest straight edge, all corners at positive x and y. */
function baseFrame(solid: Solid, topology: SolidTopology, top: number, normal: Vec3, thickness: number): Frame {
  const around = topology.around[top] ?? [];
  const length = (edge: number) => {
    const { curve, from, to } = solid.edges[edge] ?? { curve: { kind: "line" as const }, from: -1, to: -1 };
    const [p, q] = [solid.vertices[from], solid.vertices[to]];
    return curve.kind === "line" && p && q ? Math.hypot(...difference(q, p)) : 0;
  };
  const longest = around.reduce((best, { edge }) => (length(edge) > length(best) + SOLID_MATCH_MM ? edge : best), around[0]?.edge ?? -1);
  const corners = around.flatMap(({ edge }) => [solid.vertices[solid.edges[edge]?.from ?? -1] ?? [0, 0, 0] as Vec3]);
  const x = runOf(solid, topology, top, longest);
  const axes = planeAxes(normal, corners[0] ?? [0, 0, 0], x ?? undefined);
  const y = crossProduct(normal, axes.x);
  const least = (axis: Vec3) => Math.min(...corners.map((p) => dotProduct(difference(p, axes.o), axis)));
  return { x: axes.x, y, z: normal, o: moved(moved(moved(axes.o, axes.x, least(axes.x)), y, least(y)), normal, -thickness) };
}
