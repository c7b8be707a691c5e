import type { Interval } from "../../geometry/interval";
import { TOUCHING_MM, type Room } from "./room";

/** True when every pair of lengths of the first is one of the second. */
export function isWithinRoom(inner: Room, outer: Room): boolean {
  return within(inner.punch, outer.punch) && within(inner.die, outer.die) && within(inner.longer, outer.longer) && inner.together <= outer.together + TOUCHING_MM;
}

const within = (inner: Interval, outer: Interval) => inner[0] >= outer[0] - TOUCHING_MM && inner[1] <= outer[1] + TOUCHING_MM;
