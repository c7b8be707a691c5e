import type { Move } from "../order/collectMoves";

/**
 * Does a move come next in a person's order? `order`: the bends of each stroke as masks over the drawn bends; `bitsOf`: the bits that stand for
 * each of them where several strokes make one bend: all of them belong to one entry of the order.
 */
export function followsOrder(order: readonly number[], bitsOf: readonly number[]): (move: Move, formed: number) => boolean {
  const entries = order.map((mask) => {
    const bends = bitsOf.filter((_, bend) => (mask >> bend) & 1);
    return { bends, all: bends.reduce((bits, more) => bits | more, 0) };
  });
  return (move, formed) => {
    const next = entries.find(({ all }) => (formed & all) !== all);
    return next !== undefined && (move.mask & ~next.all) === 0 && next.bends.every((bits) => (move.mask & bits) !== 0);
  };
}
