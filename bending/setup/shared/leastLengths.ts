import type { Interval } from "../../geometry/interval";
import { TOUCHING_MM, type Room } from "./room";

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
