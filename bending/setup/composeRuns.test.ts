import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { mm } from "../core/units";
import type { ToolPiece } from "../tooling/tool";
import { composeRuns } from "./composeRuns";

const piece = (length: number, index: number): ToolPiece => ({ id: `p${index}`, length: mm(length), horn: null, rack: null });
const stocks = fc.array(fc.constantFrom(10, 15, 20, 30, 40, 50, 100, 200), { minLength: 1, maxLength: 9 }).map((lengths) => lengths.map(piece));

/** Every subset: the shortest sum that reaches the need, and the fewest pieces that do. */
function everySubset(pieces: readonly ToolPiece[], need: number): { readonly shortest: number; readonly fewest: number } {
  let [shortest, fewest] = [Infinity, Infinity];
  for (let set = 1; set < 2 ** pieces.length; set += 1) {
    const chosen = pieces.filter((_, i) => (set >> i) & 1);
    const sum = chosen.reduce((total, { length }) => total + length, 0);
    if (sum < need) continue;
    shortest = Math.min(shortest, sum);
    fewest = Math.min(fewest, chosen.length);
  }
  return { shortest, fewest };
}

describe("composeRuns", () => {
  it("holds the shortest run and the run of fewest pieces that real subsets make", () => {
    fc.assert(fc.property(stocks, fc.integer({ min: 5, max: 400 }), (pieces, need) => {
      const runs = composeRuns(pieces, need, 0);
      const { shortest, fewest } = everySubset(pieces, need);
      expect(Math.min(...runs.map(({ length }) => length))).toBe(shortest);
      expect(Math.min(...runs.map((run) => run.pieces.length))).toBe(fewest);
    }));
  });

  it("uses no piece twice, reaches the need and keeps gaps within the limit", () => {
    fc.assert(fc.property(stocks, fc.integer({ min: 5, max: 400 }), fc.integer({ min: 0, max: 5 }), (pieces, need, gap) => {
      for (const run of composeRuns(pieces, need, gap)) {
        expect(new Set(run.pieces.map(({ id }) => id)).size).toBe(run.pieces.length);
        expect(run.gap).toBeLessThanOrEqual(gap + 1e-9);
        expect(run.length).toBeGreaterThanOrEqual(need - 1e-9);
        expect(run.length).toBeCloseTo(run.pieces.reduce((sum, { length }) => sum + length, 0) + run.gap * (run.pieces.length - 1), 6);
      }
    }));
  });

  it("draws pieces apart only as far as the gap allows", () => {
    const pieces = [100, 100].map(piece);
    expect(composeRuns(pieces, 204, 5)).toEqual([{ pieces: expect.anything(), gap: 4, length: 204 }]);
    expect(composeRuns(pieces, 206, 5)).toEqual([]);
  });
});
