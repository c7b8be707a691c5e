import { mm } from "../core/units";
import { holeOverDie } from "../handbook/holeOverDie";
import type { Bend } from "../part/partModel";
import { boxesNear } from "./boxesNear";
import type { FindingsContext } from "./context";
import { drawnHoles, type DrawnHole } from "./drawnHoles";
import type { Finding } from "./finding";
import { farthestNeed } from "./farthestNeed";
import { holeNeeds } from "./holeNeeds";
import { movedHole } from "./movedHole";
import { holeGap } from "./holeGap";
import { shownLength } from "./shownLength";

const GUIDE = "distance from the hole's edge to the inside of the bend; the guides say it at 90 degrees, other angles are measured from where the bend begins all the same";
const OVER_DIE = "a hole over the V's opening pulls out of shape (from memory)";

/**
 * Holes that forming pulls out of shape. The guides ask for so much thickness plus the inside radius from the inside of the
 * bend: at 90 degrees that is the same thickness from where the bend begins, which is how every angle is judged here. A hole
 * farther off that still lies over the V's opening is a note.
 */
export function holesNearBends(context: FindingsContext): readonly Finding[] {
  const { part } = context;
  const holes = drawnHoles(part, context.fields, context.bendsOn);
  return holes.flatMap((hole, i) => hole.bends.flatMap((index): readonly Finding[] => {
    const [bend, box] = [part.bends[index], context.zoneBoxes[index]];
    const found = bend && box && boxesNear(hole.box, box, farthestNeed(context, bend)) ? judge(context, holes, hole, i, bend) : null;
    return found ? [found] : [];
  }));
}

function judge(context: FindingsContext, holes: readonly DrawnHole[], hole: DrawnHole, i: number, bend: Bend): Finding | null {
  const { part, units } = context;
  const { gap, into, away, from, to } = holeGap(hole, bend);
  const needs = holeNeeds(context, hole, bend);
  // A hole past the bend's end is moved as if it stood beside it.
  const across = (to[0] - from[0]) * away[0] + (to[1] - from[1]) * away[1];
  const tooNear = into > 0 || gap < needs.guide - 1e-6;
  const overDie = bend.hem === null && holeOverDie(mm(gap + bend.allowance / 2 + 1e-6), needs.vOpening);
  if (!tooNear && !overDie) return null;
  const wanted = Math.max(needs.guide, tooNear && bend.hem !== null ? 0 : needs.opening);
  const face = part.faces[hole.face]?.id ?? "";
  const length = (value: number) => shownLength(value, units);
  const ceil = (value: number) => shownLength(value, units, "up");
  const message = into > 0
    ? `The hole reaches ${length(into)} into bend ${bend.id}, so it opens into an oval as the bend forms; cut it after bending, or keep it ${ceil(wanted)} from where the bend begins.`
    : tooNear
      ? `The hole is ${length(gap)} from where bend ${bend.id} begins and pulls out of shape; ${ceil(needs.guide)} is the least${wanted > needs.guide ? `, ${ceil(wanted)} keeps it off the opening of a V ${shownLength(needs.vOpening, units)} too` : ""}.`
      : `The hole is ${length(gap)} from where bend ${bend.id} begins, over the opening of a V ${shownLength(needs.vOpening, units)}, and may pull out of shape; from ${ceil(wanted)} on it lies on the die.`;
  return {
    key: `hole ${hole.entry?.path ?? `${face} ${i}`} ${bend.id}`,
    rule: "hole",
    severity: tooNear ? "caution" : "note",
    title: into > 0 ? "Hole in the bend" : tooNear ? "Hole too near the bend" : "Hole over the die",
    message,
    source: tooNear ? `${needs.source}: ${GUIDE}` : OVER_DIE,
    faces: [face],
    bends: [bend.id],
    paths: hole.entry ? [hole.entry.path] : [],
    marks: [{ kind: "region", outline: hole.outline }, { kind: "line", from, to }, { kind: "line", from: bend.line[0], to: bend.line[1] }],
    measure: { value: into > 0 ? -into : gap, wanted, unit: "mm" },
    cure: movedHole(context, holes, hole, away, into > 0 ? wanted + into : wanted - across),
  };
}
