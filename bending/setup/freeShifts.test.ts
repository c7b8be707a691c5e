import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { freeShifts, type Standing } from "./freeShifts";

const standing = fc.record({
  offset: fc.integer({ min: -300, max: 300 }),
  length: fc.integer({ min: 10, max: 300 }),
  forbidden: fc.array(fc.tuple(fc.integer({ min: -400, max: 400 }), fc.integer({ min: 1, max: 150 })).map(([from, by]) => [from, from + by] as const), { maxLength: 3 }),
});

/** Said plainly: does any tool overlap an interval that is forbidden to it when the line lies at this shift? */
const overlaps = (shift: number, tools: readonly Standing[]) => tools.some(({ offset, length, forbidden }) =>
  forbidden.some(([from, to]) => offset - length / 2 - shift < to && offset + length / 2 - shift > from));

describe("freeShifts", () => {
  it("is where nothing overlaps, and nowhere else", () => {
    fc.assert(fc.property(fc.integer({ min: 0, max: 200 }), fc.array(standing, { maxLength: 4 }), (reach, tools) => {
      const free = freeShifts(reach, tools);
      for (let shift = -reach; shift <= reach; shift += 0.5) {
        const inside = free.some(([from, to]) => shift >= from + 1e-3 && shift <= to - 1e-3);
        const outside = free.every(([from, to]) => shift < from - 1e-3 || shift > to + 1e-3);
        if (inside) expect(overlaps(shift, tools)).toBe(false);
        if (outside) expect(overlaps(shift, tools)).toBe(true);
      }
    }), { numRuns: 60 });
  });

  it("has no place for a line that the station does not cover", () => {
    expect(freeShifts(-1, [])).toEqual([]);
    expect(freeShifts(0, [])).toEqual([[0, 0]]);
  });
});
