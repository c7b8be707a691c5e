import type { Situation } from "@/bending/plan/situation";
import type { Tool } from "@/bending/tooling/tool";
import { everyStock, type Solid } from "./everyStock";

/** A station's tools and how long their runs are, mm. */
export interface Run { readonly pair: number; readonly punch: number; readonly die: number }

export interface Stock { readonly runs: readonly Run[]; readonly pieces: number }

/** Every choice of pairs and of lengths for so many stations that the stock holds together, fewest pieces first. */
export function everyBed({ pairs }: Situation, count: number): readonly Stock[] {
  const found: Stock[] = [];
  const choose = (chosen: readonly number[]): void => {
    if (chosen.length < count) {
      for (let pair = chosen[chosen.length - 1] ?? 0; pair < pairs.length; pair += 1) choose([...chosen, pair]);
      return;
    }
    const heights = chosen.map((pair) => (pairs[pair]?.punch.height ?? 0) + (pairs[pair]?.die.height ?? 0));
    if (Math.max(...heights) - Math.min(...heights) > 0.1) return;
    const above = together(chosen.map((pair) => pairs[pair]?.punch as Tool));
    const below = together(chosen.map((pair) => pairs[pair]?.die as Tool));
    for (const punches of above) for (const dies of below) {
      const runs = chosen.map((pair, i): Run => ({ pair, punch: punches[i]?.length ?? 0, die: dies[i]?.length ?? 0 }));
      found.push({ runs, pieces: [...punches, ...dies].reduce((sum, { pieces }) => sum + pieces, 0) });
    }
  };
  choose([]);
  return found.sort((a, b) => a.pieces - b.pieces);
}

/** Runs for stations with these tools: stations of one tool share its pieces. */
function together(tools: readonly Tool[]): readonly (readonly Solid[])[] {
  const kinds = [...new Set(tools)];
  return kinds.reduce<readonly (readonly (Solid | undefined)[])[]>((sets, tool) => {
    const places = tools.flatMap((one, i) => (one === tool ? [i] : []));
    return sets.flatMap((set) => everyStock(tool, places.length).map((solids) => set.map((known, i) => (places.includes(i) ? solids[places.indexOf(i)] : known))));
  }, [tools.map(() => undefined)]) as readonly (readonly Solid[])[];
}
