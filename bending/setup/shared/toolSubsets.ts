import type { PairPlace } from "./preparedWish";
import type { ShutHeight } from "./shutHeights";

/** The pairs that each set of just so many tools makes, for every set that can make every wish. */
export function toolSubsets({ pairs, wishes }: ShutHeight, kinds: number): readonly (readonly PairPlace[])[] {
  const tools = [...new Set(pairs.flatMap(({ punch, die }) => [punch, die]))].sort((a, b) => a - b);
  const ways = wishes.map(({ rooms }) => pairs.filter((_, index) => rooms[index]));
  const distinct = [...new Map(ways.map((way) => [way.map(({ punch, die }) => `${punch}/${die}`).join(), way])).values()];
  const found: (readonly PairPlace[])[] = [];
  const chosen = new Set<number>();
  const has = ({ punch, die }: PairPlace) => chosen.has(punch) && chosen.has(die);
  const add = (from: number): void => {
    if (chosen.size === kinds) {
      if (distinct.every((way) => way.some(has))) found.push(pairs.filter(has));
      return;
    }
    for (let at = from; at < tools.length && tools.length - at >= kinds - chosen.size; at += 1) {
      const tool = tools[at];
      if (tool === undefined) continue;
      chosen.add(tool);
      add(at + 1);
      chosen.delete(tool);
    }
  };
  add(0);
  return found;
}
