import { invariant } from "../../core/invariant";
import { EMPTY_AREA_MM2 } from "../../core/tolerance";
import { signedArea } from "../../geometry/signedArea";
import type { Vec2 } from "../../geometry/vec2";
import { fromEdge, onEdge } from "../edgeCut";
import type { Bend } from "../partModel";
import type { CutUp } from "./cutSheet";
import { cornerPoint } from "./cornerPoint";
import type { FlatZone } from "./flatZone";
import type { ZoneJoint } from "./joinZones";

/** A bend of the model, its line turned so that the parent lies on its left. */
export function joinedBend(joint: ZoneJoint, { pieces }: CutUp, id: string, leftIsParent: boolean, parent: number, child: number): Bend {
  const [first] = joint.zones;
  invariant(first, "joinedBend: a joint has a zone");
  const { source, basis, ...resolved } = first.bend;
  const { right, left, line } = extent(first, joint.zones);
  const quad = [right[0], right[1], left[1], left[0]];
  const regions = joint.own.flatMap((piece) => pieces[piece] ?? []);
  const area = regions.reduce((sum, { outline, holes }) => sum + signedArea(outline) + holes.reduce((taken, hole) => taken + signedArea(hole), 0), 0);
  const whole = regions.length === 1 && Math.abs(area - signedArea(quad)) <= EMPTY_AREA_MM2 * Math.max(1, area);
  return {
    ...resolved,
    id,
    allowanceSource: source,
    allowanceBasis: basis,
    parent,
    child,
    region: whole ? null : regions,
    strokeWith: null,
    line: leftIsParent ? line : [line[1], line[0]],
    zone: leftIsParent ? [left[0], right[0], right[1], left[1]] : [right[1], left[1], left[0], right[0]],
  };
}

interface Extent {
  readonly right: readonly [Vec2, Vec2];
  readonly left: readonly [Vec2, Vec2];
  readonly line: readonly [Vec2, Vec2];
}

/** From where the first of the zones begins to where the last ends, along the first one's line. */
function extent(first: FlatZone, zones: readonly FlatZone[]): Extent {
  const ends = (pointsOf: (zone: FlatZone) => readonly Vec2[], height: number): readonly [Vec2, Vec2] => {
    const alongs = zones.flatMap(pointsOf).map((p) => onEdge(first.axes, p)[0]);
    return [fromEdge(first.axes, [Math.min(...alongs), height]), fromEdge(first.axes, [Math.max(...alongs), height])];
  };
  // A zone whose line was drawn the other way round has its left border on the right.
  const border = (side: 1 | -1) => (zone: FlatZone) => {
    const turned = zone.axes.along[0] * first.axes.along[0] + zone.axes.along[1] * first.axes.along[1] < 0;
    return (turned === side > 0 ? zone.right : zone.left).map(cornerPoint);
  };
  return {
    right: ends(border(-1), -first.half),
    left: ends(border(1), first.half),
    line: ends(({ chord }) => [chord.start.point, chord.end.point], 0),
  };
}
