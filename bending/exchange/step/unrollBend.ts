import { crossProduct } from "../../geometry/crossProduct";
import { difference } from "../../geometry/difference";
import { dotProduct } from "../../geometry/dotProduct";
import type { Frame } from "../../geometry/frame";
import { moved } from "../../geometry/moved";
import type { Vec2 } from "../../geometry/vec2";
import type { Vec3 } from "../../geometry/vec3";
import type { Loop, Solid } from "./solid";

export type BendSide = "parent" | "child";

/** A place on one of a bend's two lines: how far along the bend from its start, mm. */
export interface BendEnd {
  readonly on: BendSide;
  readonly along: number;
}

/** The rim of a bend's round face from one of its lines to the next; `path` without the two ends. */
export interface BendRun {
  readonly from: BendEnd;
  readonly to: BendEnd;
  readonly path: readonly Vec2[];
}

/** Points are (mm along the bend from its start, part of the bend's angle: 0 at the parent, 1 at the child). */
export interface UnrolledBend {
  /** Loops that touch neither plate. */
  readonly holes: readonly (readonly Vec2[])[];
  readonly runs: readonly BendRun[];
}

/**
 * A round face of a bend laid flat. `edges` are the solid's edges along the parent and along the child, `child` is the child's
 * frame (x along the bend, from its start), `angle` what the bend turns through, radians.
 */
export function unrollBend(solid: Solid, face: number, edges: Readonly<Record<BendSide, readonly number[]>>, child: Frame, angle: number): UnrolledBend {
  const surface = solid.faces[face]?.surface;
  if (surface?.kind !== "cylinder") return { holes: [], runs: [] };
  const vertex = (index: number | undefined): Vec3 => solid.vertices[index ?? -1] ?? surface.point;
  const radial = (p: Vec3): Vec3 => difference(p, moved(surface.point, surface.axis, dotProduct(difference(p, surface.point), surface.axis)));
  const [first, last] = [radial(vertex(solid.edges[edges.parent[0] ?? -1]?.from)), radial(vertex(solid.edges[edges.child[0] ?? -1]?.from))];
  const turned = (r: Vec3) => Math.atan2(dotProduct(crossProduct(first, r), surface.axis), dotProduct(first, r));
  const sense = turned(last) < 0 ? -1 : 1;
  const at = (p: Vec3): Vec2 => {
    const turn = turned(radial(p)) * sense;
    // Beyond the far side of the bend the angle has come round once.
    return [dotProduct(difference(p, child.o), child.x), (turn < angle / 2 - Math.PI ? turn + 2 * Math.PI : turn) / angle];
  };
  const corners = (loop: Loop) => loop.map(({ edge: number, forward }) => {
    const edge = solid.edges[number];
    const between = edge?.curve.kind === "other" ? edge.curve.between : [];
    const on: BendSide | null = edges.parent.includes(number) ? "parent" : edges.child.includes(number) ? "child" : null;
    return { on, start: at(vertex(forward ? edge?.from : edge?.to)), between: (forward ? between : [...between].reverse()).map(at) };
  });
  const loops = (solid.faces[face]?.loops ?? []).map(corners);
  return {
    holes: loops.filter((loop) => loop.every(({ on }) => on === null)).map((loop) => loop.flatMap(({ start, between }) => [start, ...between])),
    runs: loops.flatMap(runsOf),
  };
}

function runsOf(loop: readonly { readonly on: BendSide | null; readonly start: Vec2; readonly between: readonly Vec2[] }[]): readonly BendRun[] {
  const n = loop.length;
  return loop.flatMap(({ on }, i): readonly BendRun[] => {
    const after = loop[(i + 1) % n];
    if (on === null || !after) return [];
    const path: Vec2[] = [];
    for (let k = i + 1; k <= i + n; k += 1) {
      const corner = loop[k % n];
      if (!corner) return [];
      if (corner.on === null) path.push(corner.start, ...corner.between);
      else return path.length === 0 ? [] : [{ from: { on, along: after.start[0] }, to: { on: corner.on, along: corner.start[0] }, path: path.slice(1) }];
    }
    return [];
  });
}
