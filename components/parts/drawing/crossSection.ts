import type { Vec2 } from "@/bending/geometry/vec2";
import type { PartModel } from "@/bending/part/partModel";

/** The folded cross-section of a part whose bends are all parallel and in one chain, in millimetres. */
export interface CrossSection {
  readonly thickness: number;
  readonly legs: readonly SectionLeg[];
  readonly bends: readonly SectionBend[];
}

/** A straight leg along its middle line; `left` is the unit normal towards the base's top side. */
export interface SectionLeg { readonly from: Vec2; readonly to: Vec2; readonly along: Vec2; readonly left: Vec2; readonly face: string }

/** Turned through `turn` radians: positive towards the top side (up). */
export interface SectionBend { readonly centre: Vec2; readonly startHeading: number; readonly turn: number; readonly insideRadius: number; readonly id: string }

const dot = (a: Vec2, b: Vec2): number => a[0] * b[0] + a[1] * b[1];
const unit = (angle: number): Vec2 => [Math.cos(angle), Math.sin(angle)];
const step = (p: Vec2, way: Vec2, by: number): Vec2 => [p[0] + way[0] * by, p[1] + way[1] * by];

/** Null when the part has no single cross-section. The middle leg lies level. */
export function crossSection(part: PartModel): CrossSection | null {
  const first = part.bends[0];
  if (first === undefined) return null;
  const line: Vec2 = [first.line[1][0] - first.line[0][0], first.line[1][1] - first.line[0][1]];
  const size = Math.hypot(...line);
  const across: Vec2 = [line[1] / size, -line[0] / size];
  const parallel = part.bends.every(({ line: [a, b] }) => Math.abs(dot([b[0] - a[0], b[1] - a[1]], across)) < 1e-4);
  const chain = part.bends.every((bend, i) => bend.parent === i && bend.child === i + 1);
  if (!parallel || !chain) return null;
  return walk(part, part.faces.map((face) => {
    const reach = face.outline.map((point) => dot(point, across));
    return Math.max(...reach) - Math.min(...reach);
  }));
}

function walk(part: PartModel, lengths: readonly number[]): CrossSection {
  const turns = part.bends.map((bend) => (bend.direction === "up" ? bend.angle : -bend.angle));
  const middle = Math.floor((lengths.length - 1) / 2);
  let heading = -turns.slice(0, middle).reduce((sum, turn) => sum + turn, 0);
  let at: Vec2 = [0, 0];
  const legs: SectionLeg[] = [];
  const bends: SectionBend[] = [];
  part.faces.forEach((face, i) => {
    const along = unit(heading);
    const to = step(at, along, lengths[i] ?? 0);
    legs.push({ from: at, to, along, left: unit(heading + Math.PI / 2), face: face.id });
    at = to;
    const bend = part.bends[i];
    const turn = turns[i];
    if (bend === undefined || turn === undefined) return;
    const side = Math.sign(turn);
    const radius = bend.insideRadius + part.thickness / 2;
    const centre = step(at, unit(heading + (side * Math.PI) / 2), radius);
    bends.push({ centre, startHeading: heading, turn, insideRadius: bend.insideRadius, id: bend.id });
    heading += turn;
    at = step(centre, unit(heading - (side * Math.PI) / 2), radius);
  });
  return { thickness: part.thickness, legs, bends };
}
