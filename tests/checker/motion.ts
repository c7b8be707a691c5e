import type { Die, Hit, PartModel } from "@/bending";
import { move, type Point } from "./placing";
import { hitBend, placeParent, sidesOf } from "./placePart";
import { rolled, stripOf } from "./rolled";

/** How one half of the part moves in the plane across the bed, moment by moment, from where it stands at the last moment. */
export interface HalfMotion {
  /** Turns and carries (x, y) about the pivot: four numbers a moment: cos, sin, x and y that the pivot goes to. */
  readonly poses: Float64Array;
  readonly pivot: readonly [number, number];
  /** Way of the pivot so far, seen from the die and from the punch, and turn so far (radians). */
  readonly wayFromDie: Float64Array;
  readonly wayFromPunch: Float64Array;
  readonly turned: Float64Array;
}

export interface Motion {
  readonly angles: Float64Array;
  /** Height of the punch's tip at each moment. */
  readonly tips: Float64Array;
  readonly front: HalfMotion;
  readonly back: HalfMotion;
  /** The last moment at which the bend is not yet over its own angle. */
  readonly own: number;
}

/** The stroke in so many equal moments up to the bend's own angle, and on to `end`. Null when the die does not fit the bend. */
export function motionOf(part: PartModel, hit: Hit, die: Die, end: number, moments: number): Motion | null {
  const bend = hitBend(part, hit);
  const parentInFront = sidesOf(part, hit)[bend.parent] === true;
  const until = Math.min(bend.angle, end);
  const beyond = end > until + 1e-9 ? Math.max(1, Math.ceil((moments * (end - until)) / until)) : 0;
  const count = moments + beyond + 1;
  const angles = new Float64Array(count);
  const tips = new Float64Array(count);
  const parent = startHalf(count);
  const child = startHalf(count);
  const { across: [nx, ny], begin } = stripOf(bend);
  const low = bend.direction === "up" ? 0 : part.thickness;
  const over = begin + bend.allowance;
  for (let i = 0; i < count; i++) {
    const angle = i <= moments ? (until * i) / moments : until + ((end - until) * (i - moments)) / beyond;
    const placed = placeParent(part, hit, die, angle, parentInFront);
    if (!placed) return null;
    angles[i] = angle;
    tips[i] = placed.tip;
    const turn = rolled(bend, part.thickness, angle);
    place(parent, i, move(placed.placing, [nx * begin, ny * begin, low]), move(placed.placing, [nx * (begin + 1), ny * (begin + 1), low]));
    place(child, i, move(placed.placing, move(turn, [nx * over, ny * over, low])), move(placed.placing, move(turn, [nx * (over + 1), ny * (over + 1), low])));
  }
  const [front, back] = [finish(parent, tips), finish(child, tips)];
  return { angles, tips, own: moments, ...(parentInFront ? { front, back } : { front: back, back: front }) };
}

interface Started { readonly x: Float64Array; readonly y: Float64Array; readonly slope: Float64Array }

const startHalf = (count: number): Started => ({ x: new Float64Array(count), y: new Float64Array(count), slope: new Float64Array(count) });

/** Where the wing's foot is and how the wing slopes. */
function place({ x, y, slope }: Started, i: number, foot: Point, ahead: Point): void {
  x[i] = foot[0];
  y[i] = foot[1];
  slope[i] = Math.atan2(ahead[1] - foot[1], ahead[0] - foot[0]);
}

function finish({ x, y, slope }: Started, tips: Float64Array): HalfMotion {
  const { length } = x;
  const poses = new Float64Array(4 * length);
  const wayFromDie = new Float64Array(length);
  const wayFromPunch = new Float64Array(length);
  const turned = new Float64Array(length);
  const lastSlope = slope[length - 1] as number;
  for (let i = 0; i < length; i++) {
    const turn = (slope[i] as number) - lastSlope;
    poses[4 * i] = Math.cos(turn);
    poses[4 * i + 1] = Math.sin(turn);
    poses[4 * i + 2] = x[i] as number;
    poses[4 * i + 3] = y[i] as number;
    if (i === 0) continue;
    const dx = (x[i] as number) - (x[i - 1] as number);
    const dy = (y[i] as number) - (y[i - 1] as number);
    const rise = (tips[i] as number) - (tips[i - 1] as number);
    const step = Math.abs((slope[i] as number) - (slope[i - 1] as number));
    wayFromDie[i] = (wayFromDie[i - 1] as number) + Math.sqrt(dx * dx + dy * dy);
    wayFromPunch[i] = (wayFromPunch[i - 1] as number) + Math.sqrt(dx * dx + (dy - rise) * (dy - rise));
    turned[i] = (turned[i - 1] as number) + Math.min(step, 2 * Math.PI - step);
  }
  return { poses, pivot: [x[length - 1] as number, y[length - 1] as number], wayFromDie, wayFromPunch, turned };
}

/** Points at the last moment, carried to moment `i`. */
export function carry(points: Float64Array, { poses, pivot }: HalfMotion, i: number, into: Float64Array): void {
  const cos = poses[4 * i] as number;
  const sin = poses[4 * i + 1] as number;
  const x = poses[4 * i + 2] as number;
  const y = poses[4 * i + 3] as number;
  const px = pivot[0];
  const py = pivot[1];
  for (let k = 0; k < points.length; k += 3) {
    const dx = (points[k] as number) - px;
    const dy = (points[k + 1] as number) - py;
    into[k] = x + cos * dx - sin * dy;
    into[k + 1] = y + sin * dx + cos * dy;
    into[k + 2] = points[k + 2] as number;
  }
}

/** Farthest that a point of a body lies off the pivot of its half. */
export function reachOf(points: Float64Array, [px, py]: readonly [number, number]): number {
  let most = 0;
  for (let k = 0; k < points.length; k += 3) most = Math.max(most, Math.hypot((points[k] as number) - px, (points[k + 1] as number) - py));
  return most;
}
