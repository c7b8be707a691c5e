import type { Interval } from "../../geometry/interval";
import { bothRooms } from "./bothRooms";
import type { Room } from "./room";

/** mm. Lengths are in thousandths, and what touches within a millionth is one. */
const NEXT_MM = 1e-4;
const ANY: Interval = [-Infinity, Infinity];
const ANYTHING: Room = { punch: ANY, die: ANY, longer: ANY, together: Infinity };

/**
 * A room in parts that hold all its lengths with which two runs, from side by side to drawn apart, can go, while no part lets these two
 * runs in together. They do not go together because one is too long for the other, or both are too long; or, with
 * `tooLong`, because the station is as long as that and the bed too short.
 */
export function splitRoom(room: Room, punchSpan: Interval, dieSpan: Interval, tooLong: number | null): readonly Room[] {
  const part = (limits: Partial<Room>): readonly Room[] => {
    const found = bothRooms(room, { ...ANYTHING, ...limits });
    return found === null ? [] : [found];
  };
  const upTo = (most: number): Interval => [-Infinity, most];
  const over = (least: number): Interval => [least + NEXT_MM, Infinity];
  if (tooLong !== null) {
    const [short, long] = [upTo(tooLong - NEXT_MM), [tooLong - NEXT_MM, Infinity] as const];
    // As long as that: by the punch, or by the die with a shorter punch; either lengthens what the bed must hold at the least.
    return [...part({ punch: short, die: short }), ...part({ punch: long }), ...part({ punch: short, die: long })];
  }
  const punchMost = dieSpan[1] + room.longer[1];
  if (punchSpan[0] > punchMost) return [...part({ punch: upTo(punchMost) }), ...part({ punch: over(punchMost) })];
  const dieMost = punchSpan[1] - room.longer[0];
  if (dieSpan[0] > dieMost) return [...part({ die: upTo(dieMost) }), ...part({ die: over(dieMost) })];
  const punch = Math.max(punchSpan[0], room.punch[0], Math.max(dieSpan[0], room.die[0]) + room.longer[0]);
  const die = Math.max(dieSpan[0], room.die[0], punch - room.longer[1]);
  const [byPunch, byDie] = [punch <= punchSpan[0], die <= dieSpan[0]];
  if (byPunch && byDie) return [...part({ punch: upTo(room.together - die), die: [die - NEXT_MM, Infinity] }), ...part({ die: upTo(die - NEXT_MM) })];
  return byPunch ? part({ punch: upTo(punch - NEXT_MM) }) : part({ die: upTo(die - NEXT_MM) });
}
