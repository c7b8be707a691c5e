import type { Interval } from "../../geometry/interval";
import type { Room } from "./room";
import { shrunkRoom } from "./shrunkRoom";

/** The lengths with which a station holds the bends of both; null when there are none. */
export function bothRooms(a: Room, b: Room): Room | null {
  return shrunkRoom({ punch: common(a.punch, b.punch), die: common(a.die, b.die), longer: common(a.longer, b.longer), together: Math.min(a.together, b.together) });
}

const common = (a: Interval, b: Interval): Interval => [Math.max(a[0], b[0]), Math.min(a[1], b[1])];
