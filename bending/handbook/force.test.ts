import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { kiloNewton, kiloNewtonPerMetre, mm, mpa, MM_PER_INCH } from "../core/units";
import { airBendForces } from "./airBendForces";
import { bendingWork } from "./bendingWork";
import { chartForce, chartForces } from "./chartForce";
import { forceByMethod } from "./forceByMethod";
import { forceForms } from "./forceForms";
import { materialMultiplier } from "./materialMultiplier";
import { methodForceRange } from "./methodForceRange";
import { publishedForce } from "./publishedForce";

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const form = fc.constantFrom(...forceForms);

describe("published forces", () => {
  test("the inch rule read in inches and tons is the form in millimetres and kilonewtons", () => {
    const rule = forceForms.find(({ id }) => id === "trade-575");
    if (!rule?.base) throw new Error("the inch rule is missing");
    const base = rule.base;
    fc.assert(fc.property(between(0.02, 0.5), between(0.2, 4), (t, v) => {
      const tonsPerFoot = (575 * t * t) / v;
      const inMm = publishedForce(rule, base, mm(t * MM_PER_INCH), mm(v * MM_PER_INCH));
      expect(inMm / ((tonsPerFoot * 2000 * 4.4482216153) / 304.8)).toBeCloseTo(1, 6);
    }));
  });

  test("the table has the three forms of airBendForces, with the same values", () => {
    fc.assert(fc.property(between(200, 900), between(0.5, 10), between(5, 20), (tensile, t, times) => {
      const [v, table] = [mm(times * t), forceForms.map((one) => publishedForce(one, mpa(tensile), mm(t), mm(times * t)) as number)];
      for (const { perMetre } of airBendForces(mpa(tensile), mm(t), v).forms) {
        expect(Math.min(...table.map((value) => Math.abs(value / perMetre - 1)))).toBeLessThan(1e-9);
      }
    }));
  });
});

describe("methods, material and work", () => {
  test("the factors in use lie within what is published, and a shop's own take their place", () => {
    const air = kiloNewtonPerMetre(100);
    for (const method of ["air", "bottoming", "coining"] as const) {
      const range = methodForceRange(air, method);
      expect(forceByMethod(air, method)).toBeGreaterThanOrEqual(range.lowest);
      expect(forceByMethod(air, method)).toBeLessThanOrEqual(range.highest);
    }
    expect(methodForceRange(air, "bottoming")).toEqual({ lowest: 250, highest: 500 });
    expect(methodForceRange(air, "coining")).toEqual({ lowest: 500, highest: 4000 });
    expect(forceByMethod(air, "bottoming", { air: 1, bottoming: 3.5, coining: 6 })).toBe(350);
  });

  test("bottoming asks for at least what air bending does, whatever the shape", () => {
    for (const shape of Object.keys(chartForces) as (keyof typeof chartForces)[]) {
      expect(chartForce(shape, "bottoming", mm(2)).lowest).toBeGreaterThan(chartForce(shape, "air", mm(2)).highest);
    }
  });

  test("a multiplier times the base force is the force of the material", () => {
    fc.assert(fc.property(form, between(100, 1000), between(300, 500), (one, tensile, base) => {
      const steel = publishedForce(one, mpa(base), mm(2), mm(16));
      expect(steel * materialMultiplier(mpa(tensile), mpa(base))).toBeCloseTo(publishedForce(one, mpa(tensile), mm(2), mm(16)), 8);
    }));
  });

  test("twice the travel is twice the work", () => {
    expect(bendingWork(kiloNewton(4), mm(20))).toBeCloseTo(2 * bendingWork(kiloNewton(4), mm(10)), 12);
  });
});
