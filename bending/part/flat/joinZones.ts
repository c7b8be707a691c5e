import type { FieldProblem } from "../../core/problem";
import { fail, ok, type Result } from "../../core/result";
import { EMPTY_AREA_MM2, SAME_POINT_MM } from "../../core/tolerance";
import { polygonContains } from "../../geometry/polygonContains";
import { signedArea } from "../../geometry/signedArea";
import type { Vec2 } from "../../geometry/vec2";
import { onEdge } from "../edgeCut";
import type { CutUp } from "./cutSheet";
import { joinedBend } from "./joinedBend";
import type { FlatZone } from "./flatZone";
import type { Bend, Face } from "../partModel";
import type { ZoneCut } from "./zoneCuts";

/** A bend between two pieces: one zone, or several on one line (on both sides of a notch or a window). */
export interface ZoneJoint {
  readonly zones: readonly FlatZone[];
  /** Pieces: the zones' own, and those on the left and right of the line. */
  readonly own: readonly number[];
  readonly left: number;
  readonly right: number;
}

/** Faces and bends out of the pieces of a cut-up flat, numbered from the base outwards; every face but the base is named after its bend. */
export function joinZones(cutUp: CutUp, cuts: readonly ZoneCut[], zones: readonly FlatZone[], basePoint: Vec2 | undefined): Result<{ readonly faces: readonly Face[]; readonly bends: readonly Bend[] }, readonly FieldProblem[]> {
  const joints = jointsOf(cutUp, cuts, zones);
  if (!joints.ok) return joints;
  const inZone = new Set(joints.value.flatMap(({ own }) => own));
  const base = basePiece(cutUp, inZone, basePoint);
  if (base === null) return fail([{ path: "flat.base", message: "must be a point within one of the faces" }]);
  const index = new Map([[base, 0]]);
  const face = (piece: number, id: string, bend: number | null): Face => ({ id, outline: cutUp.pieces[piece]?.outline ?? [], holes: cutUp.pieces[piece]?.holes ?? [], holeContours: [], bend });
  const faces: Face[] = [face(base, "base", null)];
  const bends: Bend[] = [];
  const names = new Set<string>();
  const waiting = [...joints.value];
  while (waiting.length > 0) {
    const next = waiting.findIndex(({ left, right }) => index.has(left) !== index.has(right));
    const [joint] = next < 0 ? [] : waiting.splice(next, 1);
    if (!joint) return fail([{ path: waiting[0]?.zones[0]?.path ?? "flat.bends", message: "the bends close a ring; a sheet folds only as a tree of faces" }]);
    const leftIsParent = index.has(joint.left);
    const [parent, child] = leftIsParent ? [joint.left, joint.right] : [joint.right, joint.left];
    const id = freeName(joint.zones[0]?.bend.id ?? "", names);
    bends.push(joinedBend(joint, cutUp, id, leftIsParent, index.get(parent) ?? 0, faces.length));
    index.set(child, faces.length);
    faces.push(face(child, id, bends.length - 1));
  }
  return ok({ faces, bends });
}

/** Further bends of one drawn line (tabs side by side) are numbered after the first. */
function freeName(id: string, names: Set<string>): string {
  let name = id;
  for (let k = 2; names.has(name); k++) name = `${id}-${k}`;
  names.add(name);
  return name;
}

function basePiece({ pieces }: CutUp, inZone: ReadonlySet<number>, point: Vec2 | undefined): number | null {
  let best: number | null = null;
  pieces.forEach(({ outline }, i) => {
    if (inZone.has(i)) return;
    if (point ? polygonContains(outline, point) : best === null || signedArea(outline) > signedArea(pieces[best]?.outline ?? []) + EMPTY_AREA_MM2) best = i;
  });
  return best;
}

function jointsOf(cutUp: CutUp, cuts: readonly ZoneCut[], zones: readonly FlatZone[]): Result<readonly ZoneJoint[], readonly FieldProblem[]> {
  const found = zones.map(() => ({ own: new Set<number>(), left: new Set<number>(), right: new Set<number>() }));
  cuts.forEach((cut, i) => {
    const [sides, of] = [cutUp.sides[i], found[cut.zone]];
    if (!sides || !of || cut.border === "end") return;
    if (sides.left >= 0) of.own.add(sides.left);
    if (sides.right >= 0) of[cut.border].add(sides.right);
  });
  const zonePieces = new Set(found.flatMap(({ own }) => [...own]));
  const joints: ZoneJoint[] = [];
  const problems: FieldProblem[] = [];
  zones.forEach((zone, i) => {
    const { own, left: onLeft, right: onRight } = found[i] ?? { own: [], left: new Set<number>(), right: new Set<number>() };
    const [left, right] = [[...onLeft], [...onRight]];
    const say = (message: string) => problems.push({ path: zone.path, message });
    const [l, r] = [left[0], right[0]];
    if (left.length > 1 || right.length > 1) say("the bend joins more than two faces; draw a line of its own for each, or carry the cut between them through the bend");
    else if (l === undefined || r === undefined || zonePieces.has(l) || zonePieces.has(r)) say("nothing plane is left beside the bend; move its line further from the next one and from the edge");
    else if (l === r) say("the bend line does not part the sheet in two; it must run from edge to edge");
    else {
      const k = joints.findIndex((joint) => sameBend(joint, zone, l, r));
      const joint = joints[k];
      if (joint) joints[k] = { ...joint, zones: [...joint.zones, zone], own: [...joint.own, ...own] };
      else joints.push({ zones: [zone], own: [...own], left: l, right: r });
    }
  });
  return problems.length > 0 ? fail(problems) : ok(joints);
}

/** Lines that stand this far off one another are two lines (mm). */
const ONE_LINE_MM = 0.05;

/** Whether the zone goes on with a bend that already joins these two pieces. */
function sameBend({ zones, left, right }: ZoneJoint, zone: FlatZone, l: number, r: number): boolean {
  const [first] = zones;
  if (!first) return false;
  const same = left === l && right === r;
  if (!same && !(left === r && right === l)) return false;
  const off = [0, zone.axes.length].map((a) => onEdge(first.axes, [zone.axes.origin[0] + zone.axes.along[0] * a, zone.axes.origin[1] + zone.axes.along[1] * a])[1]);
  return off.every((value) => Math.abs(value) <= ONE_LINE_MM) && first.bend.direction === zone.bend.direction
    && Math.abs(first.bend.angle - zone.bend.angle) <= SAME_POINT_MM && Math.abs(first.half - zone.half) <= SAME_POINT_MM;
}
