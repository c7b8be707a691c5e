import { prismGap } from "../clearance/prismGap";
import { MEANT_CONTACT_MM } from "../core/tolerance";
import type { PartModel } from "../part/partModel";
import { foldedBodies, type FoldedBody } from "./foldedBodies";
import { sweepPairs } from "./sweepPairs";

export interface SelfMeeting {
  readonly one: FoldedBody;
  readonly other: FoldedBody;
  /** How far the two would have to be moved apart, mm. */
  readonly depth: number;
}

/**
 * Faces and bends of the finished part that stand in one another by more than `MEANT_CONTACT_MM`: what touches (a closed hem, a
 * corner that was drawn closed) does not. A bend is not asked about the two faces that it joins. Convex plates against convex
 * plates by separating axes, those whose boxes meet only; bends are plates that hold the true arc, so what is said to meet may stand
 * clear by their surplus of 0.8 of the tolerance, and nothing that meets deeper is missed.
 */
export function selfMeetings(part: PartModel): readonly SelfMeeting[] {
  const bodies = foldedBodies(part);
  const found: SelfMeeting[] = [];
  sweepPairs(Float64Array.from(bodies.flatMap((body) => boxOf(body))), -MEANT_CONTACT_MM, (i, j) => {
    const [one, other] = [bodies[i], bodies[j]];
    if (!one || !other || joined(part, one, other) || joined(part, other, one)) return;
    const depth = depthOf(one, other);
    if (depth > MEANT_CONTACT_MM) found.push({ one, other, depth });
  });
  return found;
}

function joined({ bends }: PartModel, bend: FoldedBody, face: FoldedBody): boolean {
  const { parent, child } = (bend.of === "bend" && face.of === "face" ? bends[bend.index] : undefined) ?? { parent: -1, child: -1 };
  return parent === face.index || child === face.index;
}

function depthOf(one: FoldedBody, other: FoldedBody): number {
  let deepest = 0;
  for (const p of one.plates) {
    for (const q of other.plates) {
      if (apart(p.box, q.box)) continue;
      deepest = Math.max(deepest, -prismGap(p.points, p.count, q.points, q.count, -MEANT_CONTACT_MM));
    }
  }
  return deepest;
}

function apart(p: Float64Array, q: Float64Array): boolean {
  for (let axis = 0; axis < 3; axis++) {
    if ((p[axis] as number) > (q[3 + axis] as number) - MEANT_CONTACT_MM || (q[axis] as number) > (p[3 + axis] as number) - MEANT_CONTACT_MM) return true;
  }
  return false;
}

function boxOf({ plates }: FoldedBody): readonly number[] {
  return [0, 1, 2, 3, 4, 5].map((k) => plates.reduce((most, { box }) => (k < 3 ? Math.min(most, box[k] as number) : Math.max(most, box[k] as number)), k < 3 ? Infinity : -Infinity));
}
