import type { Body } from "./bodies";
import { convexDistance, type Bar } from "./convexDistance";
import { carry, reachOf, type HalfMotion, type Motion } from "./motion";
import { boxInto, boxToBar, type Box } from "./boxes";
import { barsOf, boxOfBar, type Thing } from "./toolBars";

export interface Contact {
  readonly body: Body;
  readonly moment: number;
  readonly distance: number;
}

export interface StrokeAnswer {
  /** The first moment at which something comes nearer than asked; null when nothing does. */
  readonly contact: Contact | null;
  /** The nearest that was seen on the way; where nothing came near, a lower bound. */
  readonly nearest: Contact | null;
}

/** Moments at which what is meant to touch is looked at. */
const MEANT_MOMENTS = 12;

/** A bar with its box and the way that it lay off the body that is asked about. */
interface Asked { readonly bar: Bar; readonly box: readonly [number, number, number, number]; readonly axis: Float64Array }

const box: Box = new Float64Array(6);
const roomForHull = new Float64Array(3 * 4096);
const roomForPart = new Float64Array(3 * 4096);

/**
 * Does a half of the part come as near as `near` to a thing (shaved when `near` is 0) in the stroke? Where it stands d off, the next
 * moments in which no point of it can have come d nearer are passed over: its turn and the way of its pivot so far bound that.
 */
export function strokeContact(bodies: readonly Body[], motion: Motion, half: HalfMotion, thing: Thing, near: number): StrokeAnswer {
  const asked = barsOf({ ...thing, lift: 0 }, near === 0).map((bar): Asked => ({ bar, box: boxOfBar(bar), axis: new Float64Array(3) }));
  const way = thing.onRam ? half.wayFromPunch : half.wayFromDie;
  const { turned } = half;
  const last = motion.angles.length - 1;
  let nearest: Contact | null = null;
  for (const body of bodies) {
    if (body.z[0] - thing.to > near || thing.from - body.z[1] > near) continue;
    const reach = reachOf(body.hull, half.pivot);
    const least = body.level && near === 0 ? Math.max(1, Math.floor(last / MEANT_MOMENTS)) : 1;
    const hull = roomForHull.subarray(0, body.hull.length);
    for (const one of asked) one.axis.fill(0);
    for (let i = 0; i <= last; ) {
      const lift = thing.lift + (thing.onRam ? motion.tips[i] as number : 0);
      carry(body.hull, half, i, hull);
      boxInto(hull, box);
      let distance = boxToBar(box, lift, thing.shape.box, thing.from, thing.to);
      if (distance <= near + 4) distance = exact(body, half, i, hull, lift, asked, near);
      if (nearest === null || distance < nearest.distance) nearest = { body, moment: i, distance };
      if (distance <= near) return { contact: { body, moment: i, distance }, nearest };
      if (i === last) break;
      const spare = distance - near + (way[i] as number) + reach * (turned[i] as number);
      let next = Math.min(i + least, last);
      while (next < last && (way[next] as number) + reach * (turned[next] as number) < spare) next++;
      i = next;
    }
  }
  return { contact: null, nearest };
}

/** Distance of a body at a moment: of its hull, and where that is too near, of its parts. */
function exact(body: Body, half: HalfMotion, moment: number, hull: Float64Array, lift: number, asked: readonly Asked[], near: number): number {
  const least = leastOf(hull, lift, asked, near, true);
  if (least > near) return least;
  const parts = body.parts();
  if (parts === null) return least;
  let ofParts = FAR;
  for (const part of parts) {
    const placed = roomForPart.subarray(0, part.length);
    carry(part, half, moment, placed);
    boxInto(placed, box);
    ofParts = Math.min(ofParts, leastOf(placed, lift, asked, near, false));
    if (ofParts <= near) return ofParts;
  }
  return ofParts;
}

/** mm. Farther than this is far. */
const FAR = 64;

/** Least distance of a placed body, whose box is in `box`, to the bars. */
function leastOf(points: Float64Array, lift: number, asked: readonly Asked[], near: number, warm: boolean): number {
  let least = FAR;
  for (const one of asked) {
    if (boxToBar(box, lift, one.box, one.bar.from, one.bar.to) >= least) continue;
    least = Math.min(least, convexDistance(points, lift, one.bar, least, warm ? one.axis : null, near));
  }
  return least;
}
