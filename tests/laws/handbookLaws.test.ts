import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { builtInMaterials, deg, kiloNewton, mm, mpa, rad, toRad } from "@/bending";
import { airBendForce } from "@/bending/handbook/airBendForce";
import { airBendForces } from "@/bending/handbook/airBendForces";
import { bendAllowance } from "@/bending/handbook/bendAllowance";
import { bendDeduction } from "@/bending/handbook/bendDeduction";
import { bendingWork, WORK_FILL } from "@/bending/handbook/bendingWork";
import type { OpeningBetweenTops } from "@/bending/handbook/dieOpening";
import { faaAllowance } from "@/bending/handbook/faaAllowance";
import { forceForms } from "@/bending/handbook/forceForms";
import { kFactorFromDeduction } from "@/bending/handbook/kFactorFromDeduction";
import { straightLengthGroups } from "@/bending/handbook/material";
import { outsideSetback } from "@/bending/handbook/outsideSetback";
import { publishedForce } from "@/bending/handbook/publishedForce";
import { punchTravel } from "@/bending/handbook/punchTravel";
import { resolveAllowance } from "@/bending/handbook/resolveAllowance";
import { straightLength } from "@/bending/handbook/straightLength";

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const angle = between(0.01, Math.PI).map(rad);
const radius = between(0, 40).map(mm);
const thickness = between(0.3, 12).map(mm);
const k = between(0.2, 0.6);

describe("allowance, deduction and K", () => {
  test("the allowance of two angles is the allowance of their sum, by every formula that gives one", () => {
    fc.assert(fc.property(angle, angle, radius, thickness, k, (a, b, r, t, factor) => {
      const formulas = [
        (turned: typeof a) => bendAllowance(turned, r, factor, t),
        (turned: typeof a) => faaAllowance(turned, r, t),
        ...straightLengthGroups.map((group) => (turned: typeof a) => straightLength(group, turned, r, t)),
      ];
      for (const allowance of formulas) expect(allowance(rad(a + b))).toBeCloseTo(allowance(a) + allowance(b), 9);
    }));
  });

  test("K comes back out of the deduction that it gave", () => {
    fc.assert(fc.property(angle, radius, thickness, k, (a, r, t, factor) => {
      const deduction = bendDeduction(a, r, t, bendAllowance(a, r, factor, t));
      expect(kFactorFromDeduction(deduction, a, r, t)).toBeCloseTo(factor, 6);
    }));
  });

  test("whatever the rule and at every angle, allowance, deduction, K and setback agree", () => {
    const rule = fc.constantFrom("shop", "din6935", "machinery", "faa", "k", undefined);
    fc.assert(fc.property(rule, fc.constantFrom(...builtInMaterials), angle, radius, thickness, fc.option(k, { nil: undefined }), (name, material, a, r, t, kOverride) => {
      const found = resolveAllowance({ rule: name, material, thickness: t, insideRadius: r, angle: a, kOverride });
      expect(found.allowance + found.deduction).toBeCloseTo(2 * outsideSetback(a, r, t), 9);
      expect(bendAllowance(a, r, found.k, t)).toBeCloseTo(found.allowance, 9);
      expect(kFactorFromDeduction(found.deduction, a, r, t)).toBeCloseTo(found.k, 6);
      expect(found.allowance).toBeGreaterThan(0);
      expect(found.source).not.toBe("");
    }));
  });
});

describe("force with t² L / V", () => {
  const tensile = between(200, 900).map(mpa);

  test("the three forms shown side by side: strength and t² / V, times 1 + 4 t / V where the form claims that", () => {
    fc.assert(fc.property(tensile, thickness, between(5, 20), between(0.3, 4), (rm, t, times, scale) => {
      const force = (strength: typeof rm, thick: number, v: number) => airBendForces(strength, mm(thick), mm(v)).forms.map(({ perMetre }) => perMetre as number);
      const v = times * t;
      const law = ([one, other, oehler]: readonly number[], ratio: number, ratioPlus: number, of: readonly number[]) => {
        expect(one).toBeCloseTo((of[0] ?? NaN) * ratio, 6);
        expect(other).toBeCloseTo((of[1] ?? NaN) * ratio, 6);
        expect(oehler).toBeCloseTo((of[2] ?? NaN) * ratio * ratioPlus, 6);
      };
      const base = force(rm, t, v);
      const plus = (thick: number, opening: number) => (1 + (4 * thick) / opening) / (1 + (4 * t) / v);
      law(force(rm, scale * t, v), scale ** 2, plus(scale * t, v), base);
      law(force(rm, t, scale * v), 1 / scale, plus(t, scale * v), base);
      law(force(rm, scale * t, scale * v), scale, 1, base);
      law(force(mpa(scale * rm), t, v), scale, 1, base);
      expect(airBendForces(rm, t, mm(v)).spread).toBeLessThan(0.36);
    }));
  });

  test("every published form at one V / t, and those without a ratio by thickness and by V alone", () => {
    fc.assert(fc.property(fc.constantFrom(...forceForms), tensile, thickness, between(5, 20), between(0.3, 4), (form, rm, t, times, scale) => {
      const force = (thick: number, v: number) => publishedForce(form, rm, mm(thick), mm(v));
      const base = force(t, times * t);
      expect(force(scale * t, scale * times * t) / base).toBeCloseTo(scale, 9);
      if (form.perRatio !== 0) return;
      expect(force(scale * t, times * t) / base).toBeCloseTo(scale ** 2, 8);
      expect(force(t, scale * times * t) / base).toBeCloseTo(1 / scale, 8);
    }));
  });

  test("no form of a V die asks for less than a plastic hinge at tensile strength takes in plane strain", () => {
    // A sheet on two supports V apart, loaded in the middle: F = 4 M / V with M = (2 / sqrt 3) Rm t² L / 4.
    fc.assert(fc.property(fc.constantFrom(...forceForms.filter(({ operation }) => operation === "v-die")), tensile, thickness, between(5, 20), (form, rm, t, times) => {
      const hinge = (2 / Math.sqrt(3)) * rm * t * t / 4;
      expect(publishedForce(form, rm, t, mm(times * t))).toBeGreaterThan((4 * hinge) / (times * t));
    }));
  });

  test("the work of a stroke to 90 degrees is that of a plastic hinge, within the fill of the force-travel diagram and the whole of it", () => {
    fc.assert(fc.property(tensile, between(0.5, 8), between(6, 12), between(0.15, 0.18), between(0.04, 0.12), (rm, t, times, radiusPart, shoulderPart) => {
      const opening = mm(t * times);
      const right = toRad(deg(90));
      const travel = punchTravel(right, mm(radiusPart * opening), mm(t), { measured: "between-tops", opening, shoulderRadius: mm(shoulderPart * opening) });
      const perMetre = airBendForce(rm, mm(t), opening);
      // Moment times angle for each metre, in joules: the moment at tensile strength in plane strain.
      const hinge = ((2 / Math.sqrt(3)) * rm * t * t / 4) * right;
      expect(hinge).toBeGreaterThan(bendingWork(kiloNewton(perMetre), travel, WORK_FILL[0]));
      expect(hinge).toBeLessThan(bendingWork(kiloNewton(perMetre), travel, 1));
    }));
  });
});

test("the punch starts at the flat sheet and goes deeper for every degree", () => {
  // A sheet and a die that fit: V of 6 to 12 thicknesses, radius about V / 6.
  fc.assert(fc.property(between(0.5, 8), between(6, 12), between(0.1, 0.2), between(0.04, 0.12), between(0, 140), between(0.01, 10), (t, times, radiusPart, shoulderPart, degrees, more) => {
    const opening = mm(t * times);
    const die: OpeningBetweenTops = { measured: "between-tops", opening, shoulderRadius: mm(shoulderPart * opening) };
    const travel = (turned: number) => punchTravel(toRad(deg(turned)), mm(radiusPart * opening), mm(t), die);
    expect(travel(0)).toBe(0);
    expect(travel(degrees + more)).toBeGreaterThan(travel(degrees));
  }));
});
