import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { lowerEnvelopeEnd, type CostLine } from "./lowerEnvelopeEnd";

const lines = fc.array(fc.record({ slope: fc.integer({ min: 0, max: 30 }), rest: fc.integer({ min: 0, max: 500 }) }), { minLength: 1, maxLength: 12 });
const costAt = ({ slope, rest }: CostLine, value: number) => rest + slope * value;
const least = (all: readonly CostLine[], value: number): CostLine => all.reduce((a, b) => (costAt(b, value) < costAt(a, value) - 1e-9 ? b : a));

describe("the end of a line's stay at the bottom", () => {
  it("is where another line comes under it, and nowhere nearer", () => {
    fc.assert(fc.property(lines, fc.integer({ min: 1, max: 10 }), fc.constantFrom(0.25, 4), (all, from, by) => {
      const own = least(all, from);
      const to = from * by;
      const end = lowerEnvelopeEnd(own, (value) => least(all, value), from, to);
      const under = (value: number) => costAt(least(all, value), value) < costAt(own, value) - 1e-3;
      expect(end.kind).toBe(under(to) ? "taken over" : "kept");
      if (end.kind !== "taken over") return;
      expect(costAt(end.by, end.at)).toBeCloseTo(costAt(own, end.at), 6);
      expect(under(end.at)).toBe(false);
      expect(costAt(end.by, to)).toBeLessThan(costAt(own, to));
    }), { numRuns: 400 });
  });

  it("stays open where the least line is not known", () => {
    expect(lowerEnvelopeEnd({ slope: 1, rest: 0 }, () => null, 1, 4)).toEqual({ kind: "open" });
  });
});
