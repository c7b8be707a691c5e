import type { MachineSettings } from "../../tooling/machine";
import type { ToolPiece } from "../../tooling/tool";

/** mm. Shorter pieces are not looked for. */
const SHORTEST_MM = 5;
/** Lengths that are looked at, at the most. */
const MOST = 400;

/**
 * Lengths of one further piece that could make a run for one of the lines together with pieces in stock: what each sum of them leaves
 * open of the line, its uncovered ends and the gaps beside the pieces allowed for. Ascending, each once; between two neighbours nothing changes.
 */
export function missingLengths(lines: readonly number[], stock: readonly ToolPiece[], settings: MachineSettings): readonly number[] {
  const needs = [...new Set(lines.map((line) => Math.max(SHORTEST_MM, line - 2 * settings.maxUncoveredEnd)))];
  const longest = Math.max(0, ...needs);
  const sums = new Map<number, number>([[0, 0]]);
  for (const { length, horn } of stock) {
    if (horn !== null) continue;
    for (const [sum, count] of [...sums]) {
      const next = Number((sum + length).toFixed(3));
      if (next < longest && (sums.get(next) ?? Infinity) > count + 1) sums.set(next, count + 1);
    }
  }
  const lengths = new Set<number>();
  for (const need of needs) {
    for (const [sum, count] of sums) {
      for (const gaps of count > 0 ? [0, count * settings.maxSectionGap] : [0]) {
        if (sum < need) lengths.add(Math.max(SHORTEST_MM, Number((need - sum - gaps).toFixed(3))));
      }
    }
  }
  return [...lengths].sort((a, b) => a - b).slice(-MOST);
}
