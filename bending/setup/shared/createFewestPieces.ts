import { carryCost } from "./carryCost";
import type { PieceStock } from "./createPieceStock";
import { leastLengths } from "./leastLengths";
import type { Room } from "./room";

/** What a station within a room costs at the least out of the whole stock; null when no pieces make one. */
export type FewestPieces = (punch: number, die: number, room: Room) => number | null;

/** Tools are named by their place in `stocks`. Each room is worked out once. */
export function createFewestPieces(stocks: readonly PieceStock[]): FewestPieces {
  const known = new Map<string, number | null>();
  return (punch, die, room) => {
    const key = `${punch}/${die}/${room.punch.join()}/${room.die.join()}/${room.longer.join()}/${room.together}`;
    const answer = known.get(key);
    if (answer !== undefined) return answer;
    const found = fewest(stocks[punch], stocks[die], room);
    known.set(key, found);
    return found;
  };
}

function fewest(punch: PieceStock | undefined, die: PieceStock | undefined, room: Room): number | null {
  const punchSums = (punch?.sums ?? []).filter(({ length, apart }) => length <= room.punch[1] + 1e-6 && apart >= room.punch[0] - 1e-6);
  const dieSums = (die?.sums ?? []).filter(({ length, apart }) => length <= room.die[1] + 1e-6 && apart >= room.die[0] - 1e-6);
  let best = Infinity;
  for (const above of punchSums) {
    if (carryCost(above.count + (dieSums[0]?.count ?? 0), above.length) >= best) continue;
    for (const below of dieSums) {
      const cost = carryCost(above.count + below.count, above.length + below.length);
      if (carryCost(above.count + below.count, above.length) >= best) break;
      if (cost < best && leastLengths(room, [above.length, above.apart], [below.length, below.apart]) !== null) best = cost;
    }
  }
  return Number.isFinite(best) ? best : null;
}
