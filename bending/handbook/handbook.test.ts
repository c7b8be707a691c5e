import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { deg, mm, mpa, rad, toRad, MM_PER_INCH } from "../core/units";
import { airBendForces } from "./airBendForces";
import { airBendForce } from "./airBendForce";
import { bendAllowance } from "./bendAllowance";
import { bendDeduction } from "./bendDeduction";
import { builtInMaterials } from "./materials";
import { din6935CompensatingValue } from "./din6935CompensatingValue";
import { kFactorFromDeduction } from "./kFactorFromDeduction";
import { outsideSetback } from "./outsideSetback";
import { penetrationDepth } from "./penetrationDepth";
import { resolveAllowance } from "./resolveAllowance";
import { springback } from "./springback";
import { springbackRatio } from "./springbackRatio";

const angle = fc.double({ min: 0.01, max: Math.PI, noNaN: true }).map(rad);
const radius = fc.double({ min: 0, max: 40, noNaN: true }).map(mm);
const thickness = fc.double({ min: 0.3, max: 12, noNaN: true }).map(mm);
const k = fc.double({ min: 0.2, max: 0.6, noNaN: true });
const material = fc.constantFrom(...builtInMaterials);
const rule = fc.constantFrom("shop", "din6935", "machinery", "faa", undefined);

describe("allowance and deduction", () => {
  test("the allowance of two angles is the allowance of their sum", () => {
    fc.assert(fc.property(angle, angle, radius, thickness, k, (a, b, r, t, factor) => {
      const parts = bendAllowance(a, r, factor, t) + bendAllowance(b, r, factor, t);
      expect(bendAllowance(rad(a + b), r, factor, t)).toBeCloseTo(parts, 9);
    }));
  });

  test("K comes back out of the deduction that it gave", () => {
    fc.assert(fc.property(angle, radius, thickness, k, (a, r, t, factor) => {
      const deduction = bendDeduction(a, r, t, bendAllowance(a, r, factor, t));
      expect(kFactorFromDeduction(deduction, a, r, t)).toBeCloseTo(factor, 6);
    }));
  });

  test("whatever the rule, allowance, deduction, K and setback agree", () => {
    fc.assert(fc.property(rule, material, angle, radius, thickness, (name, stuff, a, r, t) => {
      const found = resolveAllowance({ rule: name, material: stuff, thickness: t, insideRadius: r, angle: a });
      expect(found.allowance + found.deduction).toBeCloseTo(2 * outsideSetback(a, r, t), 9);
      expect(bendAllowance(a, r, found.k, t)).toBeCloseTo(found.allowance, 9);
      expect(found.allowance).toBeGreaterThan(0);
      expect(found.source).not.toBe("");
    }));
  });

  test("inches and millimetres give the same bend", () => {
    fc.assert(fc.property(rule, material, angle, radius, thickness, (name, stuff, a, r, t) => {
      const inMm = resolveAllowance({ rule: name, material: stuff, thickness: t, insideRadius: r, angle: a });
      const inInch = resolveAllowance({ rule: name, material: stuff, thickness: mm(t / MM_PER_INCH), insideRadius: mm(r / MM_PER_INCH), angle: a });
      expect(inInch.allowance * MM_PER_INCH).toBeCloseTo(inMm.allowance, 8);
      expect(inInch.k).toBeCloseTo(inMm.k, 8);
    }));
  });

  test("a K by hand goes before every rule, a closed hem before the rule, the shop's rule falls back and says so", () => {
    const steel = builtInMaterials[0];
    if (!steel) throw new Error("no material");
    const question = { material: steel, thickness: mm(2), insideRadius: mm(2), angle: toRad(deg(90)) };
    expect(resolveAllowance({ ...question, rule: "din6935", kOverride: 0.44 })).toMatchObject({ source: "K entered by hand" });
    expect(resolveAllowance({ ...question, rule: "din6935", kOverride: 0.44 }).k).toBeCloseTo(0.44, 12);
    expect(resolveAllowance({ ...question, rule: "shop" }).source).toBe("DIN 6935 (no shop value for this bend)");
    const hem = resolveAllowance({ ...question, insideRadius: mm(0), angle: rad(Math.PI), closedHem: true });
    expect(hem.deduction).toBeCloseTo(0.43 * 2, 2);
  });

  test("steel and stainless go by DIN 6935, the rest by the straight lengths", () => {
    for (const stuff of builtInMaterials) {
      const { source } = resolveAllowance({ material: stuff, thickness: mm(1), insideRadius: mm(1), angle: toRad(deg(90)) });
      expect(source.startsWith("DIN 6935")).toBe(stuff.group === "steel" || stuff.group === "stainless");
    }
  });

  test("DIN's two forms meet at 90 degrees of opening, and large radii change sign at 65 degrees 24.5 minutes", () => {
    const at = (opening: number, r: number) => din6935CompensatingValue(toRad(deg(opening)), mm(r), mm(1));
    expect(at(90 + 1e-9, 3)).toBeCloseTo(at(90, 3), 6);
    const turn = 180 - 360 / Math.PI;
    const perRadius = (opening: number) => (at(opening, 2e6) - at(opening, 1e6)) / 1e6;
    expect(perRadius(turn)).toBeCloseTo(0, 9);
    expect(perRadius(turn - 0.1)).toBeLessThan(0);
    expect(perRadius(turn + 0.1)).toBeGreaterThan(0);
  });
});

describe("force, depth and springback", () => {
  test("force goes with strength, with the square of thickness and against the V at one V / t", () => {
    fc.assert(fc.property(thickness, fc.double({ min: 5, max: 20, noNaN: true }), fc.double({ min: 0.5, max: 3, noNaN: true }), (t, times, scale) => {
      const one = airBendForce(mpa(400), t, mm(times * t));
      expect(airBendForce(mpa(800), t, mm(times * t)) / one).toBeCloseTo(2, 9);
      expect(airBendForce(mpa(400), mm(scale * t), mm(scale * times * t)) / one).toBeCloseTo(scale, 9);
      expect(airBendForces(mpa(400), t, mm(times * t)).spread).toBeLessThan(0.36);
    }));
  });

  test("the punch goes deeper for every degree, from 0 when flat", () => {
    const die = { vOpening: mm(16), shoulderRadius: mm(1.5) };
    let last = penetrationDepth(rad(0), mm(8 / 3), mm(2), die);
    expect(last).toBe(0);
    for (let degrees = 1; degrees <= 120; degrees++) {
      const next = penetrationDepth(toRad(deg(degrees)), mm(8 / 3), mm(2), die);
      expect(next).toBeGreaterThan(last);
      last = next;
    }
  });

  test("springing back from the demanded bend leaves the bend that was wanted", () => {
    fc.assert(fc.property(material, thickness, fc.double({ min: 0.5, max: 8, noNaN: true }), (stuff, t, times) => {
      const wanted = { angle: toRad(deg(90)), radius: mm(times * t) };
      const demanded = springback(wanted.angle, wanted.radius, t, stuff);
      const after = springbackRatio(demanded.radius, t, stuff);
      expect(demanded.angle).toBeGreaterThan(wanted.angle);
      expect(after?.finalRadius ?? NaN).toBeCloseTo(wanted.radius, 6);
      expect(demanded.angle * (after?.angleRatio ?? NaN)).toBeCloseTo(wanted.angle, 9);
    }));
  });

  test("a bend that stays elastic has no springback ratio", () => {
    expect(springbackRatio(mm(1000), mm(1), { yield: mpa(235), modulus: mpa(210_000) })).toBeNull();
  });
});
