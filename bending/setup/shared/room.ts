import type { Interval } from "../../geometry/interval";
import type { MachineSettings } from "../../tooling/machine";
import { SHORTEST_RUN_MM } from "../runsFor";
import type { SharedWay, SharedWish } from "./sharedWish";

/**
 * The lengths that the two runs of a station may have so that it holds certain bends: of the punch, of the die, of
 * the punch less the die, and of both together at the most, mm. Both runs have one middle.
 */
export interface Room {
  readonly punch: Interval;
  readonly die: Interval;
  readonly longer: Interval;
  readonly together: number;
}

/** mm. Ends that meet within this do not overlap; the same as where one step is placed. */
const TOUCHING_MM = 1e-6;

/**
 * The lengths with which a station holds a bend by itself; null when there are none. With a the half of the line that must
 * be covered, [p, q] and [r, s] the windows of punch and die, P and D the lengths and c the station's middle from the line's:
 * |c| <= min(P, D) / 2 - a, p + P / 2 <= c <= q - P / 2 and r + D / 2 <= c <= s - D / 2. Such a c exists just when
 * each lower end is under each upper one, which are the bounds below.
 */
export function roomOf({ lineLength }: Pick<SharedWish, "lineLength">, { punchWindow: [p, q], dieWindow: [r, s] }: SharedWay, { maxUncoveredEnd }: MachineSettings): Room | null {
  const a = lineLength / 2 - maxUncoveredEnd;
  const beside = { punch: Math.min(-p, q) - a, die: Math.min(-r, s) - a };
  if (beside.punch < -TOUCHING_MM || beside.die < -TOUCHING_MM) return null;
  const least = Math.max(SHORTEST_RUN_MM, 2 * a);
  return shrunk({ punch: [least, q - p], die: [least, s - r], longer: [-2 * beside.die, 2 * beside.punch], together: 2 * Math.min(s - p, q - r) });
}

/** The lengths with which a station holds the bends of both; null when there are none. */
export function bothRooms(a: Room, b: Room): Room | null {
  return shrunk({ punch: common(a.punch, b.punch), die: common(a.die, b.die), longer: common(a.longer, b.longer), together: Math.min(a.together, b.together) });
}

/** True when every pair of lengths of the first is one of the second. */
export function isWithinRoom(inner: Room, outer: Room): boolean {
  return within(inner.punch, outer.punch) && within(inner.die, outer.die) && within(inner.longer, outer.longer) && inner.together <= outer.together + TOUCHING_MM;
}

/**
 * The shortest runs, both at once, within a room and within the lengths that pieces give; null when there are none. What
 * bounds them from below only ever asks one to be longer for the other, so there is one least pair.
 */
export function leastLengths(room: Room, punchSpan: Interval, dieSpan: Interval): readonly [punch: number, die: number] | null {
  let punch = Math.max(room.punch[0], punchSpan[0]);
  let die = Math.max(room.die[0], dieSpan[0]);
  punch = Math.max(punch, die + room.longer[0]);
  die = Math.max(die, punch - room.longer[1]);
  const fits = punch <= Math.min(room.punch[1], punchSpan[1]) + TOUCHING_MM && die <= Math.min(room.die[1], dieSpan[1]) + TOUCHING_MM
    && punch + die <= room.together + TOUCHING_MM && punch - die >= room.longer[0] - TOUCHING_MM;
  return fits ? [punch, die] : null;
}

const common = (a: Interval, b: Interval): Interval => [Math.max(a[0], b[0]), Math.min(a[1], b[1])];
const within = (inner: Interval, outer: Interval) => inner[0] >= outer[0] - TOUCHING_MM && inner[1] <= outer[1] + TOUCHING_MM;

/** Every bound drawn in as far as the others say; null when nothing is left. */
function shrunk(room: Room): Room | null {
  const least = leastLengths(room, room.punch, room.die);
  if (least === null) return null;
  const [punchLeast, dieLeast] = least;
  const punchMost = Math.min(room.punch[1], room.die[1] + room.longer[1], room.together - dieLeast, (room.together + room.longer[1]) / 2);
  const dieMost = Math.min(room.die[1], room.punch[1] - room.longer[0], room.together - punchLeast, (room.together - room.longer[0]) / 2);
  return {
    punch: [punchLeast, punchMost],
    die: [dieLeast, dieMost],
    longer: [Math.max(room.longer[0], punchLeast - dieMost), Math.min(room.longer[1], punchMost - dieLeast)],
    together: Math.min(room.together, punchMost + dieMost),
  };
}
