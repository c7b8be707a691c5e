import type { PreparedWish } from "./preparedWish";
import { isWithinRoom } from "./isWithinRoom";

/** The wishes that ask for something: without those that every station which holds some other wish holds as well. */
export function essentialWishes(wishes: readonly PreparedWish[]): readonly PreparedWish[] {
  const kept: PreparedWish[] = [];
  wishes.forEach((one, index) => {
    const follows = wishes.some((other, at) => at !== index && isImplied(one, other) && (at < index || !isImplied(other, one)));
    if (!follows) kept.push(one);
  });
  return kept;
}

/** Does every station that holds `by` hold this wish? */
function isImplied({ rooms }: PreparedWish, by: PreparedWish): boolean {
  return by.rooms.every((theirs, pair) => {
    const own = rooms[pair];
    return theirs === null || (own !== null && own !== undefined && isWithinRoom(theirs, own));
  });
}
