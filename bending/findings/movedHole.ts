import { polygonBounds, type Bounds2 } from "../geometry/polygonBounds";
import type { Vec2 } from "../geometry/vec2";
import { polygonContains } from "../geometry/polygonContains";
import { segmentsCross } from "../geometry/segmentsCross";
import { holesMeet } from "../part/holeWithin";
import { mmPer } from "../core/units";
import { boxesNear } from "./boxesNear";
import type { FindingsContext } from "./context";
import type { DrawnHole } from "./drawnHoles";
import type { Cure } from "./finding";
import { farthestNeed } from "./farthestNeed";
import { holeNeeds } from "./holeNeeds";
import { lengthCure } from "./lengthCure";
import { holeGap } from "./holeGap";

/** Under this much of the way an axis does not lead away from the bend. */
const LEAST_PART = 0.3;

/**
 * A round hole moved along one of its coordinates so that it comes `by` (mm) farther `away` (unit vector in the sheet), unless it would
 * leave its face, meet another hole or come too near another bend.
 */
export function movedHole(context: FindingsContext, holes: readonly DrawnHole[], hole: DrawnHole, away: Vec2, by: number): Cure | null {
  const entry = hole.entry;
  const face = context.part.faces[hole.face];
  if (!entry || !face || !("circle" in entry.hole)) return null;
  const parts = entry.axes.map((axis) => axis[0] * away[0] + axis[1] * away[1]);
  const axis = Math.abs(parts[0] ?? 0) >= Math.abs(parts[1] ?? 0) ? 0 : 1;
  const part = parts[axis] ?? 0;
  if (Math.abs(part) < LEAST_PART) return null;
  const now = entry.hole.circle[axis];
  const cure = lengthCure(`${entry.path}.circle[${axis}]`, now + by / part, part > 0 ? "up" : "down", context.units);
  const shift = typeof cure.value === "number" ? cure.value * mmPer(context.units) - now : 0;
  const [dx, dy] = [shift * entry.axes[axis][0], shift * entry.axes[axis][1]];
  const outline = hole.outline.map(([x, y]): Vec2 => [x + dx, y + dy]);
  const box = polygonBounds(outline);
  const circle = hole.circle && { ...hole.circle, centre: [hole.circle.centre[0] + dx, hole.circle.centre[1] + dy] as const };
  const others = holes.filter((other) => other !== hole && other.face === hole.face && boxesNear(other.box, box, 0));
  const clear = staysWithin(outline, box, face.outline) && !others.some((other) => holesMeet(other.outline, outline))
    && (context.bendsOn[hole.face] ?? []).every((index) => {
      const bend = context.part.bends[index];
      const zone = context.zoneBoxes[index];
      if (!bend || !zone || !boxesNear(box, zone, farthestNeed(context, bend))) return true;
      const { gap, into } = holeGap({ outline, circle }, bend);
      const before = holeGap(hole, bend);
      const needs = holeNeeds(context, hole, bend);
      return into === 0 && (gap >= Math.max(needs.guide, bend.hem === null ? needs.opening : 0) - 1e-6 || gap >= before.gap);
    });
  return clear ? cure : null;
}

/** Inside with one corner and crossing nothing is wholly inside; only the edges near the hole are looked at. */
function staysWithin(hole: readonly Vec2[], box: Bounds2, face: readonly Vec2[]): boolean {
  if (!hole[0] || !polygonContains(face, hole[0])) return false;
  return !face.some((p, i) => {
    const q = face[(i + 1) % face.length] ?? p;
    if (!boxesNear(polygonBounds([p, q]), box, 0)) return false;
    return hole.some((a, k) => segmentsCross(p, q, a, hole[(k + 1) % hole.length] ?? a) !== null);
  });
}
