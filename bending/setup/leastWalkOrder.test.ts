import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { leastWalkOrder } from "./leastWalkOrder";

const permutations = (items: readonly number[]): readonly (readonly number[])[] =>
  (items.length < 2 ? [items] : items.flatMap((first) => permutations(items.filter((one) => one !== first)).map((rest) => [first, ...rest])));

/** mm walked from stroke to stroke when the stations stand in this order. */
function walked(order: readonly number[], lengths: readonly number[], gap: number, strokes: readonly number[]): number {
  const middle: number[] = [];
  let at = 0;
  for (const station of order) {
    middle[station] = at + (lengths[station] ?? 0) / 2;
    at += (lengths[station] ?? 0) + gap;
  }
  return strokes.slice(1).reduce((sum, to, index) => sum + Math.abs((middle[to] ?? 0) - (middle[strokes[index] ?? to] ?? 0)), 0);
}

describe("leastWalkOrder", () => {
  it("walks as little as the best of all orders", () => {
    const cases = fc.integer({ min: 1, max: 6 }).chain((count) => fc.record({
      lengths: fc.array(fc.integer({ min: 20, max: 800 }), { minLength: count, maxLength: count }),
      strokes: fc.array(fc.integer({ min: 0, max: count - 1 }), { maxLength: 14 }),
      gap: fc.integer({ min: 0, max: 300 }),
    }));
    fc.assert(fc.property(cases, ({ lengths, strokes, gap }) => {
      const order = leastWalkOrder(lengths, gap, strokes);
      expect([...order].sort((a, b) => a - b)).toEqual(lengths.map((_, index) => index));
      expect(walked(order, lengths, gap, strokes)).toBeCloseTo(Math.min(...permutations(lengths.map((_, index) => index)).map((one) => walked(one, lengths, gap, strokes))), 6);
    }), { numRuns: 80 });
  });

  it("stands stations that are used in turn side by side, twelve of them as well", () => {
    const strokes = [7, 2, 9, 0, 4, 11, 1, 6, 3, 10, 5, 8];
    expect([strokes, [...strokes].reverse()]).toContainEqual([...leastWalkOrder(strokes.map(() => 100), 100, strokes)]);
  });
});
