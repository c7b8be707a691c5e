import { SOLID_MATCH_MM } from "../../core/tolerance";
import type { Vec2 } from "../../geometry/vec2";
import type { DocumentHole } from "../../part/partDocument";
import type { OutlineVertex } from "./recognisedPart";

/** A hole's outline as what it is: a circle, a slot when it is exactly one, else a polygon with its arcs. */
export function readHole(outline: readonly OutlineVertex[]): DocumentHole {
  return asCircle(outline) ?? asSlot(outline) ?? { polygon: outline };
}

interface Arc {
  readonly from: Vec2;
  readonly to: Vec2;
  readonly centre: Vec2;
  readonly radius: number;
  /** Turned through, radians. */
  readonly sweep: number;
}

function asCircle(outline: readonly OutlineVertex[]): DocumentHole | null {
  const arcs = outline.map((_, i) => arcAt(outline, i));
  const [first] = arcs;
  if (!first || !arcs.every((arc) => arc !== null && sameCircle(arc, first))) return null;
  return { circle: first.centre, diameter: 2 * first.radius };
}

/** Two straight sides and two half circles, each of which may be drawn in several arcs. */
function asSlot(outline: readonly OutlineVertex[]): DocumentHole | null {
  const straight = outline.flatMap(([, , bulge], i) => (bulge === 0 ? [i] : []));
  const [first, second] = straight;
  if (straight.length !== 2 || first === undefined || second === undefined) return null;
  const n = outline.length;
  const arcsAfter = (side: number): readonly (Arc | null)[] => {
    const arcs: (Arc | null)[] = [];
    for (let i = (side + 1) % n; !straight.includes(i); i = (i + 1) % n) arcs.push(arcAt(outline, i));
    return arcs;
  };
  const ends = [arcsAfter(first), arcsAfter(second)].map(halfCircle);
  const [a, b] = ends;
  if (!a || !b || Math.abs(a.radius - b.radius) > SOLID_MATCH_MM) return null;
  return { slot: [a.centre, b.centre], width: a.radius + b.radius };
}

function halfCircle(arcs: readonly (Arc | null)[]): Arc | null {
  const [first] = arcs;
  if (!first || !arcs.every((arc) => arc !== null && sameCircle(arc, first))) return null;
  const sweep = arcs.reduce((sum, arc) => sum + (arc?.sweep ?? 0), 0);
  return Math.abs(sweep - Math.PI) * first.radius <= SOLID_MATCH_MM ? first : null;
}

const sameCircle = (a: Arc, b: Arc) =>
  Math.hypot(a.centre[0] - b.centre[0], a.centre[1] - b.centre[1]) <= SOLID_MATCH_MM && Math.abs(a.radius - b.radius) <= SOLID_MATCH_MM;

function arcAt(outline: readonly OutlineVertex[], i: number): Arc | null {
  const vertex = outline[i];
  const next = outline[(i + 1) % outline.length];
  if (!vertex || !next || vertex[2] === 0) return null;
  const [from, to]: readonly [Vec2, Vec2] = [[vertex[0], vertex[1]], [next[0], next[1]]];
  const sweep = 4 * Math.atan(vertex[2]);
  const [dx, dy] = [to[0] - from[0], to[1] - from[1]];
  // The centre lies to the left of the chord for a counter-clockwise arc of less than half a turn.
  const left = 1 / (2 * Math.tan(sweep / 2));
  const centre: Vec2 = [(from[0] + to[0]) / 2 - dy * left, (from[1] + to[1]) / 2 + dx * left];
  return { from, to, centre, radius: Math.hypot(from[0] - centre[0], from[1] - centre[1]), sweep: Math.abs(sweep) };
}
