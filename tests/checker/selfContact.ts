import type { Body, Halves } from "./bodies";
import { bodyDistance } from "./convexDistance";
import { carry, reachOf, type Motion } from "./motion";
import { boxDistance, boxInto, type Box } from "./boxes";

export interface SelfContact {
  readonly front: Body;
  readonly back: Body;
  readonly moment: number;
  readonly distance: number;
}

/** mm and moments: faces nearer than this are looked at so many times in a stroke at the least. */
const CLOSE_MM = 0.2;
const CLOSE_MOMENTS = 64;

const roomFront = new Float64Array(3 * 4096);
const roomBack = new Float64Array(3 * 4096);
const axis = new Float64Array(3);
const frontBox: Box = new Float64Array(6);
const backBox: Box = new Float64Array(6);

/** Do the two halves come as near as `near` to each other (the front half shaved when `near` is 0), up to the bend's own angle? */
export function selfContact({ front, back }: Halves, motion: Motion, near: number): { readonly contact: SelfContact | null; readonly nearest: number } {
  let nearest = Infinity;
  const { own } = motion;
  const stride = Math.max(1, Math.floor(own / CLOSE_MOMENTS));
  for (const one of front) {
    for (const other of back) {
      if (one.z[0] - other.z[1] > near || other.z[0] - one.z[1] > near) continue;
      const reachOne = reachOf(one.hull, motion.front.pivot);
      const reachOther = reachOf(other.hull, motion.back.pivot);
      const hullOne = roomFront.subarray(0, one.hull.length);
      const hullOther = roomBack.subarray(0, other.hull.length);
      axis.fill(0);
      for (let i = 0; i <= own; ) {
        carry(one.hull, motion.front, i, hullOne);
        carry(other.hull, motion.back, i, hullOther);
        boxInto(hullOne, frontBox);
        boxInto(hullOther, backBox);
        let distance = boxDistance(frontBox, backBox);
        if (distance <= near + 4) {
          distance = bodyDistance(hullOne, hullOther, near + 64, axis, near);
          if (distance <= near) distance = closely(motion, one, other, i, near === 0, near);
        }
        nearest = Math.min(nearest, distance);
        if (distance <= near) return { contact: { front: one, back: other, moment: i, distance }, nearest };
        if (i === own) break;
        const spare = distance - near + travel(motion, i, reachOne, reachOther);
        // What is drawn close, as the two sides of a slit, is looked at now and then.
        let next = Math.min(own, i + (distance - near < CLOSE_MM ? stride : 1));
        while (next < own && travel(motion, next, reachOne, reachOther) < spare) next++;
        i = next;
      }
    }
  }
  return { contact: null, nearest };
}

/** Farthest that two points of the halves can have neared each other until a moment. */
function travel({ front, back }: Motion, i: number, reachFront: number, reachBack: number): number {
  return (front.wayFromPunch[i] as number) + (back.wayFromPunch[i] as number) + reachFront * (front.turned[i] as number) + reachBack * (back.turned[i] as number);
}

/** Least distance of the bodies' parts; the front one's shaved ones when `shaved`. */
function closely(motion: Motion, front: Body, back: Body, moment: number, shaved: boolean, near: number): number {
  let least = near + 64;
  const backs = (back.parts() ?? [back.hull]).map((points) => {
    const placed = new Float64Array(points.length);
    carry(points, motion.back, moment, placed);
    return placed;
  });
  for (const points of shaved ? front.core() : front.parts() ?? [front.hull]) {
    const placed = roomFront.subarray(0, points.length);
    carry(points, motion.front, moment, placed);
    boxInto(placed, frontBox);
    for (const other of backs) {
      boxInto(other, backBox);
      if (boxDistance(frontBox, backBox) < least) least = Math.min(least, bodyDistance(placed, other, least, null, near));
      if (least <= near) return least;
    }
  }
  return least;
}
