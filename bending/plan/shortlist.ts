import type { Situation } from "./situation";
import type { ToolPair } from "./toolPair";

/** Pairs kept for each set of bends that they fit: few at first, more when those give no plan. */
export const SHORTLISTS = [6, 24] as const;
/** mm. Punches whose bodies agree this well leave the part the same room. */
const SAME_BODY_MM = 8;

/**
 * The pairs to look at first: for every set of bends that pairs fit, those of the nearest V, taken in turn from
 * punches of different shape (straight ones, relieved ones) and dies of different width.
 */
export function shortlist({ pairs, fits, part }: Situation, most: (typeof SHORTLISTS)[number]): readonly ToolPair[] {
  const groups = new Map<string, ToolPair[]>();
  for (const pair of pairs) {
    const fitting = part.bends.map((_, bend) => (fits[bend]?.[pair.index]?.ok ? 1 : 0)).join("");
    const wishes = part.bends.reduce((sum, _, bend) => {
      const fit = fits[bend]?.[pair.index];
      return sum + (fit?.ok ? fit.wishes.length : 0);
    }, 0);
    const key = `${fitting}/${wishes > 0 ? 1 : 0}`;
    groups.set(key, [...(groups.get(key) ?? []), pair]);
  }
  const kept = [...groups.values()].flatMap((group) => inTurn(group).slice(0, most));
  return kept.sort((a, b) => a.index - b.index);
}

/** One of every shape first, then the second of each, and so on. */
function inTurn(pairs: readonly ToolPair[]): readonly ToolPair[] {
  const shapes = new Map<string, ToolPair[]>();
  for (const pair of pairs) {
    const key = `${shapeOf(pair.punch)}/${shapeOf(pair.die)}`;
    shapes.set(key, [...(shapes.get(key) ?? []), pair]);
  }
  const lists = [...shapes.values()].map((list) => [...list].sort((a, b) => stock(b) - stock(a)));
  const longest = Math.max(0, ...lists.map((list) => list.length));
  return Array.from({ length: longest }, (_, round) => lists.flatMap((list) => list[round] ?? [])).flat();
}

const stock = ({ punch, die }: ToolPair) => Math.min(20, punch.pieces.length) + Math.min(20, die.pieces.length);

/** How far the body reaches to the front and to the back over the half next to the sheet, roughly. */
function shapeOf(tool: ToolPair["punch"] | ToolPair["die"]): string {
  const near = tool.profile.filter((p) => Math.abs(p[1]) < tool.height * 0.75).map((p) => p[0]);
  return [Math.min(0, ...near), Math.max(0, ...near)].map((x) => Math.round(x / SAME_BODY_MM)).join(",");
}
