import { MEANT_CONTACT_MM } from "../core/tolerance";
import type { Mm } from "../core/units";
import type { Bend } from "../part/partModel";
import { NO_MEETING, type Meeting } from "./meeting";
import { posePrism, wingPose } from "./pose";
import type { Prism } from "./prism";
import { prismGap } from "./prismGap";

export interface SelfQuestion {
  readonly bend: Bend;
  readonly thickness: Mm;
  /** Plates of a face in front and of one at the back, in the state of the moment. */
  readonly front: readonly Prism[];
  readonly back: readonly Prism[];
  /** The same in the finished part. */
  readonly finishedFront: readonly Prism[];
  readonly finishedBack: readonly Prism[];
  /** Half the finished angle; `steps` equal steps in which no two corners near each other by more than `margin`. */
  readonly to: number;
  readonly steps: number;
  readonly margin: Mm;
}

/**
 * Two faces on the two sides of a stroke, from flat to the finished angle. The margin holds, unless the faces are nearer by
 * design: in the finished part, or before the stroke; then they may come as near as that (an overlap by design, as of
 * neighbours in a corner that was drawn closed, within `MEANT_CONTACT_MM`).
 */
export function meetSelf(question: SelfQuestion): Meeting {
  const drawn = gapAt(question, question.finishedFront, question.finishedBack, question.to, question.margin);
  const before = gapAt(question, question.front, question.back, 0, question.margin);
  const wanted = Math.max(0, Math.min(drawn, before, question.margin)) - MEANT_CONTACT_MM;
  let deepest = 0;
  let first = Infinity;
  for (let sample = 0; sample <= question.steps; ) {
    const h = (question.to * sample) / question.steps;
    const gap = gapAt(question, question.front, question.back, h, 64 * question.margin);
    if (gap < wanted) {
      first = Math.min(first, 2 * h);
      deepest = Math.max(deepest, wanted - gap);
    }
    sample += Math.max(1, Math.floor((gap - wanted) / question.margin));
  }
  if (first === Infinity) return NO_MEETING;
  return { intervals: [sharedExtent(question)], strokeAngle: first, depth: deepest };
}

function gapAt(question: SelfQuestion, front: readonly Prism[], back: readonly Prism[], h: number, enough: number): number {
  const pose = wingPose(question.bend, question.thickness, h);
  const place = (prism: Prism, inFront: boolean): Float64Array => {
    const into = new Float64Array(prism.points.length);
    posePrism(prism.points, pose, inFront, into);
    return into;
  };
  const placed = back.map((prism) => place(prism, false));
  let least = enough;
  for (const prism of front) {
    const points = place(prism, true);
    back.forEach((other, i) => {
      const facing = placed[i];
      if (facing) least = Math.min(least, prismGap(points, prism.count, facing, other.count, least));
    });
  }
  return least;
}

/** The z-extent that the two faces have in common. */
function sharedExtent({ front, back }: SelfQuestion): readonly [number, number] {
  const low = (prisms: readonly Prism[]) => Math.min(...prisms.map((prism) => prism.z[0]));
  const high = (prisms: readonly Prism[]) => Math.max(...prisms.map((prism) => prism.z[1]));
  const [from, to] = [Math.max(low(front), low(back)), Math.min(high(front), high(back))];
  return from <= to ? [from, to] : [to, from];
}
