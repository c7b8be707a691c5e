import type { Tool } from "@/bending/tooling/tool";

/**
 * The fewest millimetres, and the fewest pieces, that pieces of a tool can stand on when they must reach over `need`: every sum of pieces by how many
 * they are, and where they may be drawn apart, `need` itself when a shorter sum reaches it with gaps. Infinity when they do not reach.
 */
export function shortestRun({ pieces }: Tool, need: number, maxGap: number): { readonly length: number; readonly pieces: number } {
  const sums = new Map<string, readonly [number, number]>([["0/0", [0, 0]]]);
  for (const piece of pieces) {
    for (const [sum, count] of [...sums.values()]) {
      const longer = Math.round((sum + piece.length) * 1000) / 1000;
      sums.set(`${longer}/${count + 1}`, [longer, count + 1]);
    }
  }
  let [length, fewest] = [Infinity, Infinity];
  for (const [sum, count] of sums.values()) {
    if (count === 0 || sum + (count - 1) * maxGap < need - 1e-9) continue;
    [length, fewest] = [Math.min(length, Math.max(sum, need)), Math.min(fewest, count)];
  }
  return { length, pieces: fewest };
}
