import type { PairPlace } from "./preparedWish";
import type { SearchEffort } from "./searchEffort";
import type { ShutHeight } from "./shutHeights";

/** The pairs that each set of just so many tools makes, for every set that can make every wish; not all of them once the effort is spent. */
export function toolSubsets({ pairs, wishes }: ShutHeight, kinds: number, effort: SearchEffort): readonly (readonly PairPlace[])[] {
  const tools = [...new Set(pairs.flatMap(({ punch, die }) => [punch, die]))].sort((a, b) => a - b);
  const ways = wishes.map(({ rooms }) => pairs.filter((_, index) => rooms[index]));
  const distinct = [...new Map(ways.map((way) => [way.map(({ punch, die }) => `${punch}/${die}`).join(), way])).values()].sort((a, b) => a.length - b.length);
  const found = new Map<string, readonly number[]>();
  const seen = new Set<string>();
  const has = (chosen: readonly number[], { punch, die }: PairPlace) => chosen.includes(punch) && chosen.includes(die);
  /** One of the pairs of each wish must be whole; what is over may be any tools. */
  const add = (chosen: readonly number[]): void => {
    const key = [...chosen].sort((a, b) => a - b).join();
    effort.step();
    if (chosen.length > kinds || seen.has(key) || effort.spent()) return;
    seen.add(key);
    const open = distinct.find((way) => !way.some((pair) => has(chosen, pair)));
    if (open === undefined && chosen.length === kinds) { found.set(key, chosen); return; }
    if (open === undefined) for (const tool of tools) { if (!chosen.includes(tool)) add([...chosen, tool]); }
    else for (const { punch, die } of open) add([...new Set([...chosen, punch, die])]);
  };
  add([]);
  return [...found.values()].map((chosen) => pairs.filter((pair) => has(chosen, pair)));
}
