import { leastLengths } from "./leastLengths";
import type { Room } from "./room";

/** Every bound drawn in as far as the others say; null when nothing is left. */
export function shrunkRoom(room: Room): Room | null {
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
