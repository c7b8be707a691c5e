import type { Bend, Face, Hit, PartModel } from "@/bending";
import { convexParts, hullOf, isWhole, type Ring } from "./convexParts";
import { SHAVED_MM, ZONE_CHORD_MM } from "./limits";
import { move, UNMOVED, type Placing, type Point } from "./placing";
import { angleOf, sidesOf } from "./placePart";
import { inStrip, stripOf } from "./rolled";

/** A face or a formed bend zone, where it stands at one moment of the stroke. */
export interface Body {
  readonly name: string;
  /** Corners x, y, z of a convex body that holds it all. */
  readonly hull: Float64Array;
  /** The same cut into convex bodies; null when the hull is the body itself. */
  readonly parts: () => readonly Float64Array[] | null;
  /** Shaved all round, as convex bodies. */
  readonly core: () => readonly Float64Array[];
  readonly z: readonly [number, number];
  /** In the plane of the wing that is bent: it is meant to touch the tools. */
  readonly level: boolean;
  readonly face: number | null;
  readonly bend: number | null;
}

export interface Halves {
  readonly front: readonly Body[];
  readonly back: readonly Body[];
}

type Shrink = (ring: Ring, by: number) => readonly Ring[];

function flatten(points: readonly Point[], m: Placing = UNMOVED): Float64Array {
  const out = new Float64Array(3 * points.length);
  let at = 0;
  for (const point of points) {
    const moved = move(m, point);
    out[at++] = moved[0];
    out[at++] = moved[1];
    out[at++] = moved[2];
  }
  return out;
}

/** All faces and all zones but those in the making, as they stand when the faces are placed so. */
export function bodiesOf(part: PartModel, hit: Hit, faces: readonly Placing[], shrink: Shrink): Halves {
  const sides = sidesOf(part, hit);
  const halves: { front: Body[]; back: Body[] } = { front: [], back: [] };
  const t = part.thickness;
  const wings = hit.bends.flatMap((i) => [part.bends[i]?.parent ?? 0, part.bends[i]?.child ?? 0]);
  const lies = (m: Placing) => wings.some((wing) => {
    const other = faces[wing] ?? UNMOVED;
    return sides[wing] === sides[faces.indexOf(m)] && [2, 6, 10].every((i) => Math.abs((m[i] ?? 0) - (other[i] ?? 0)) < 1e-9);
  });
  part.faces.forEach((face, i) => {
    const { whole, hull } = flatShape(face);
    const m = faces[i] ?? UNMOVED;
    const solid = (ring: Ring, low: number, high: number) => flatten([low, high].flatMap((z) => ring.map(([x, y]): Point => [x, y, z])), m);
    let parts: readonly Float64Array[] | null | undefined = whole ? null : undefined;
    let core: readonly Float64Array[] | undefined;
    (sides[i] ? halves.front : halves.back).push(bodyOf(`face ${face.id}`, solid(hull, 0, t), {
      parts: () => (parts === undefined ? (parts = convexParts(face.outline, face.holes).map((ring) => solid(ring, 0, t))) : parts),
      core: () => (core ??= shrink(face.outline, SHAVED_MM).flatMap((ring) => convexParts(ring, face.holes)).map((ring) => solid(ring, SHAVED_MM, t - SHAVED_MM))),
      level: lies(m), face: i, bend: null,
    }));
  });
  const at = angleOf(part, hit, 0);
  part.bends.forEach((bend, i) => {
    if (hit.bends.includes(i)) return;
    const m = faces[bend.parent] ?? UNMOVED;
    const place = (groups: readonly (readonly Point[])[]) => groups.map((points) => flatten(points, m));
    const angle = at(i);
    let parts: readonly Float64Array[] | null | undefined = angle === 0 ? null : undefined;
    (sides[bend.parent] ? halves.front : halves.back).push(bodyOf(`zone ${bend.id}`, place([zoneHull(bend, t, angle)])[0] ?? new Float64Array(), {
      parts: () => (parts === undefined ? (parts = place(zonePieces(bend, t, angle))) : parts),
      core: () => place(zonePieces(bend, t, angle, SHAVED_MM)),
      level: angle === 0 && lies(m), face: null, bend: i,
    }));
  });
  return halves;
}

const flatShapes = new WeakMap<Face, { readonly whole: boolean; readonly hull: Ring }>();

function flatShape(face: Face): { readonly whole: boolean; readonly hull: Ring } {
  const found = flatShapes.get(face) ?? { whole: isWhole(face.outline, face.holes), hull: hullOf(face.outline) };
  flatShapes.set(face, found);
  return found;
}

function bodyOf(name: string, hull: Float64Array, rest: Omit<Body, "name" | "hull" | "z">): Body {
  let [low, high] = [Infinity, -Infinity];
  for (let i = 2; i < hull.length; i += 3) {
    low = Math.min(low, hull[i] as number);
    high = Math.max(high, hull[i] as number);
  }
  return { name, hull, z: [low, high], ...rest };
}

/** Where the strip's ends lie along the line, by share of the way to the child: [start, end]. */
function endsOf(bend: Bend): (share: number) => readonly [number, number] {
  const { along: [dx, dy] } = stripOf(bend);
  const [parentStart, childStart, childEnd, parentEnd] = bend.zone.map(([x, y]) => x * dx + y * dy) as [number, number, number, number];
  return (share) => [parentStart + (childStart - parentStart) * share, parentEnd + (childEnd - parentEnd) * share];
}

/** Slices of the bent strip between chords of its arcs, as points to the parent; `shaved` off all round but between slices. */
export function zonePieces(bend: Bend, thickness: number, angle: number, shaved = 0, least = 1): readonly (readonly Point[])[] {
  const outer = angle === 0 ? 1 : bend.allowance / angle + (1 - bend.k) * thickness;
  const count = angle === 0 ? least : Math.max(least, Math.ceil(angle / (2 * Math.acos(Math.max(0, 1 - ZONE_CHORD_MM / outer)))));
  const ends = endsOf(bend);
  const inner = innermost(bend, thickness, angle);
  const [low, high] = bend.direction === "up" ? [shaved, inner - shaved] : [inner + shaved, thickness - shaved];
  return Array.from({ length: count }, (_, k): readonly Point[] => [k / count, (k + 1) / count].flatMap((share) => {
    const [start, end] = ends(share);
    return [low, high].flatMap((z) => [start + shaved, end - shaved].map((along) => inStrip(bend, thickness, angle, share, along, z)));
  }));
}

/** Height over the bottom of the inside surface, or of the axis when that lies within the sheet. */
function innermost(bend: Bend, thickness: number, angle: number): number {
  const over = angle === 0 ? Infinity : bend.allowance / angle - bend.k * thickness;
  const cut = Math.min(0, over);
  return bend.direction === "up" ? thickness + cut : -cut;
}

/** A convex body that holds the bent strip: the inside's corners, and corners far enough out to have the outside arc within. */
function zoneHull(bend: Bend, thickness: number, angle: number): readonly Point[] {
  const count = angle === 0 ? 1 : Math.max(2, Math.ceil(angle / 0.4));
  const outer = angle === 0 ? 0 : bend.allowance / angle + (1 - bend.k) * thickness;
  const out = outer * (1 / Math.cos(angle / count) - 1);
  const ends = endsOf(bend);
  const [outside, inside] = bend.direction === "up" ? [-out, innermost(bend, thickness, angle)] : [thickness + out, innermost(bend, thickness, angle)];
  const all = Array.from({ length: count + 1 }, (_, k) => ends(k / count));
  const [low, high] = [Math.min(...all.map(([start]) => start)), Math.max(...all.map(([, end]) => end))];
  return Array.from({ length: count + 1 }, (_, k) => k / count).flatMap((share) =>
    [outside, inside].flatMap((z) => [low, high].map((along) => inStrip(bend, thickness, angle, share, along, z))));
}
