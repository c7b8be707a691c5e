import fc from "fast-check";
import { expect, test } from "vitest";
import { mm, mpa, rad } from "../core/units";
import { bendAfterRelease } from "./bendAfterRelease";
import { bendUnderLoad } from "./bendUnderLoad";
import { SPRINGBACK_COLUMNS, springbackFactor, springbackTable, type SpringbackMaterial } from "./springbackFactor";
import { springbackRatio } from "./springbackRatio";

const names = Object.keys(springbackTable) as SpringbackMaterial[];
const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });

test("a value between two columns is marked and lies between theirs, a printed one is not marked", () => {
  fc.assert(fc.property(fc.constantFrom(...names), fc.nat(6), between(0.01, 0.99), (name, column, part) => {
    const [low, high] = [SPRINGBACK_COLUMNS[column] ?? NaN, SPRINGBACK_COLUMNS[column + 1] ?? NaN];
    const [left, right] = [springbackFactor(name, low), springbackFactor(name, high)];
    const found = springbackFactor(name, low + part * (high - low));
    expect(left?.interpolated).toBe(false);
    expect(found?.interpolated).toBe(true);
    expect(found?.factor).toBeLessThanOrEqual((left?.factor ?? NaN) + 1e-12);
    expect(found?.factor).toBeGreaterThanOrEqual((right?.factor ?? NaN) - 1e-12);
  }));
});

test("outside the printed columns there is no value", () => {
  expect(springbackFactor("DC01", 0.9)).toBeNull();
  expect(springbackFactor("DC01", 101)).toBeNull();
  expect(springbackFactor("X12CrNi18-8", 40)?.factor).toBe(0.63);
  expect(springbackFactor("X12CrNi18-8", 41)).toBeNull();
});

test("released, the bend under load is the bend that was wanted", () => {
  fc.assert(fc.property(between(0.1, 3), between(0.5, 50), between(0.5, 8), between(0.6, 1), (angle, radius, thickness, factor) => {
    const made = bendUnderLoad({ angle: rad(angle), radius: mm(radius) }, mm(thickness), factor);
    const after = bendAfterRelease(made, mm(thickness), factor);
    expect(after.angle).toBeCloseTo(angle, 10);
    expect(after.radius).toBeCloseTo(radius, 9);
  }));
});

test("the table's factor and the elastic recovery's angle ratio are one quantity", () => {
  fc.assert(fc.property(between(1, 40), between(0.5, 6), (times, thickness) => {
    const made = mm(times * thickness);
    const ratio = springbackRatio(made, mm(thickness), { yield: mpa(235), modulus: mpa(210_000) });
    const wanted = { angle: rad(1), radius: ratio?.finalRadius ?? mm(NaN) };
    expect(bendUnderLoad(wanted, mm(thickness), ratio?.angleRatio ?? NaN).radius).toBeCloseTo(made, 8);
  }));
});
