import { mm } from "../core/units";
import type { Bounds2 } from "../geometry/polygonBounds";
import type { Vec2 } from "../geometry/vec2";
import { holeToBend } from "../handbook/holeToBend";
import { bendDirections } from "../part/bendDirections";
import type { Bend, Face } from "../part/partModel";
import type { FindingsContext } from "./context";
import type { Finding } from "./finding";
import { shownLength } from "./shownLength";

/** Thicknesses from the bend beyond which no guide asks anything. */
const FARTHEST = 4;
/** mm. Corners this near to the bend's own ends belong to it. */
const AT_THE_END_MM = 0.05;

/**
 * Notches and corners of the outline that come down towards a bend between its two ends. The guides speak of holes; that a cut-out
 * behaves as a hole of its length is common practice, no source.
 */
export function cutOutsNearBends(context: FindingsContext): readonly Finding[] {
  const { part, bendsOn } = context;
  return part.faces.flatMap((face, index) => (bendsOn[index] ?? []).flatMap((which): readonly Finding[] => {
    const bend = part.bends[which];
    if (!bend || bend.hem !== null) return [];
    return dips(face, bend, bend.child === index, context.zoneBoxes[which], FARTHEST * part.thickness).flatMap((dip, i) => judge(context, face, bend, dip, i));
  }));
}

/** A stretch of the outline that comes nearer to the bend than what is beside it. */
interface Dip {
  readonly depth: number;
  readonly from: Vec2;
  readonly to: Vec2;
  readonly length: number;
  /** On the border of the bend, below the dip. */
  readonly foot: Vec2;
}

function judge(context: FindingsContext, face: Face, bend: Bend, dip: Dip, i: number): readonly Finding[] {
  const { part, units } = context;
  const { least, source } = holeToBend(dip.length > AT_THE_END_MM ? { kind: "slot", length: mm(dip.length) } : { kind: "round" }, part.thickness, bend.insideRadius);
  const wanted = least - bend.insideRadius;
  if (dip.depth >= wanted - 1e-6) return [];
  return [{
    key: `cut-out ${face.id} ${bend.id} ${i}`,
    rule: "cut-out",
    severity: "caution",
    title: "Cut-out too near the bend",
    message: `The outline of ${face.id} comes within ${shownLength(dip.depth, units)} of where bend ${bend.id} begins, and bulges there as it forms; ${shownLength(wanted, units, "up")} is the least, or cut it through the bend on purpose.`,
    source: `${source}, carried over from holes to cut-outs: common practice, no source`,
    faces: [face.id],
    bends: [bend.id],
    paths: [],
    marks: [{ kind: "line", from: dip.from, to: dip.to }, { kind: "line", from: dip.foot, to: dip.from }, { kind: "line", from: bend.line[0], to: bend.line[1] }],
    measure: { value: dip.depth, wanted, unit: "mm" },
    cure: null,
  }];
}

/** Local minima of the outline's height over the bend, off the two ends of the bend itself. */
function dips(face: Face, bend: Bend, isChild: boolean, box: Bounds2 | undefined, within: number): readonly Dip[] {
  const { along: d, outward: n } = bendDirections(bend);
  const side = isChild ? 1 : -1;
  const border = isChild ? bend.zone[1] : bend.zone[0];
  const far = isChild ? bend.zone[2] : bend.zone[3];
  const length = (far[0] - border[0]) * d[0] + (far[1] - border[1]) * d[1];
  const { outline } = face;
  const toLocal = ([x, y]: Vec2): Vec2 => [(x - border[0]) * d[0] + (y - border[1]) * d[1], side * ((x - border[0]) * n[0] + (y - border[1]) * n[1])];
  const near = ([x, y]: Vec2) => box !== undefined && x >= box.min[0] - within && x <= box.max[0] + within && y >= box.min[1] - within && y <= box.max[1] + within;
  const inside = ([a, h]: Vec2) => a > AT_THE_END_MM && a < length - AT_THE_END_MM && h > AT_THE_END_MM;
  const back = ([a, h]: Vec2): Vec2 => [border[0] + d[0] * a + n[0] * h * side, border[1] + d[1] * a + n[1] * h * side];
  const found: Dip[] = [];
  outline.forEach((corner, i) => {
    if (!near(corner)) return;
    const p = toLocal(corner);
    const at = (k: number) => toLocal(outline[(k + outline.length) % outline.length] ?? corner);
    // Walk a level stretch once, from its first corner.
    if (!inside(p) || level(at(i - 1), p)) return;
    let last = i;
    while (level(at(last), at(last + 1)) && last < i + outline.length) last += 1;
    const q = last === i ? p : at(last);
    if (at(i - 1)[1] > p[1] && at(last + 1)[1] > q[1] && sheetBelow(at(i - 1), p, q, at(last + 1), isChild)) {
      found.push({ depth: p[1], from: back(p), to: back(q), length: Math.abs(q[0] - p[0]), foot: back([p[0], 0]) });
    }
  });
  return found;
}

const level = (p: Vec2, q: Vec2) => Math.abs(p[1] - q[1]) < 1e-6;

/** Does the sheet lie between the dip and the bend? The outline runs counter-clockwise with the sheet on its left; a child's is seen mirrored here. */
function sheetBelow(before: Vec2, p: Vec2, q: Vec2, after: Vec2, isChild: boolean): boolean {
  const turn = p[0] === q[0] ? (p[0] - before[0]) * (after[1] - p[1]) - (p[1] - before[1]) * (after[0] - p[0]) : q[0] - p[0];
  return isChild ? turn > 0 : turn < 0;
}
