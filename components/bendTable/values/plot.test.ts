import fc from "fast-check";
import { expect, it } from "vitest";
import { plotDots } from "./plotDots";
import { plotScale } from "./plotScale";

const deductions = fc.array(fc.double({ min: -20, max: 200, noNaN: true }), { minLength: 1, maxLength: 30 });

it("a scale holds every value, in a few round steps whose labels differ", () => {
  fc.assert(fc.property(deductions, (values) => {
    const { from, to, ticks, digits } = plotScale(values);
    expect(Math.min(...values)).toBeGreaterThan(from);
    expect(Math.max(...values)).toBeLessThan(to);
    expect(ticks.length).toBeGreaterThanOrEqual(3);
    expect(ticks.length).toBeLessThanOrEqual(12);
    expect(new Set(ticks.map((tick) => tick.toFixed(digits))).size).toBe(ticks.length);
  }));
});

it("dots of one row never touch, none is lost, and the lowest row is used first", () => {
  fc.assert(fc.property(deductions, (values) => {
    const dots = plotDots(values.map((x, index) => ({ id: String(index), x })), 13);
    expect(dots.map(({ id }) => Number(id)).sort((a, b) => a - b)).toEqual(values.map((_, index) => index));
    for (const dot of dots) {
      for (const other of dots) if (dot !== other && dot.row === other.row) expect(Math.abs(dot.x - other.x)).toBeGreaterThanOrEqual(13 - 1e-9);
    }
    expect(dots.some(({ row }) => row === 0)).toBe(true);
  }));
});
