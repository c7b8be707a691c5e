import type { MachineSettings } from "../../tooling/machine";
import { SHORTEST_RUN_MM } from "../runsFor";
import { TOUCHING_MM, type Room } from "./room";
import type { SharedWay, SharedWish } from "./sharedWish";
import { shrunkRoom } from "./shrunkRoom";

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
  return shrunkRoom({ punch: [least, q - p], die: [least, s - r], longer: [-2 * beside.die, 2 * beside.punch], together: 2 * Math.min(s - p, q - r) });
}
