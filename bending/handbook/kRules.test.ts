import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { mm, rad, MM_PER_INCH } from "../core/units";
import { apexDeduction } from "./apexDeduction";
import { bendAllowance } from "./bendAllowance";
import { bendDeduction } from "./bendDeduction";
import { empiricalK } from "./empiricalK";
import { genericK } from "./genericK";
import { grooverK } from "./grooverK";
import { legToApex } from "./legToApex";
import { squareCornerDeduction } from "./squareCornerDeduction";

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });

describe("legs to the apex", () => {
  test("the flat length is one, whether legs run to the apex or to the outermost tangent", () => {
    fc.assert(fc.property(between(0.1, 2.9), between(0, 20), between(0.5, 8), between(0.3, 0.5), between(30, 90), (angle, r, t, k, leg) => {
      const [a, radius, thickness] = [rad(angle), mm(r), mm(t)];
      const allowance = bendAllowance(a, radius, k, thickness);
      const byDocument = 2 * leg - bendDeduction(a, radius, thickness, allowance);
      const byApex = 2 * legToApex(mm(leg), a, radius, thickness) - apexDeduction(a, radius, thickness, allowance);
      expect(byApex).toBeCloseTo(byDocument, 7);
    }));
  });

  test("two bends take off twice what one does", () => {
    expect(squareCornerDeduction(2, mm(3), "v-die")).toBeCloseTo(2 * squareCornerDeduction(1, mm(3), "v-die"), 12);
  });
});

describe("rules for K", () => {
  test("K is a part of the thickness up to the middle, and grows with the radius", () => {
    fc.assert(fc.property(fc.constantFrom("soft", "medium", "hard"), between(0, 40), between(0, 20), between(0.5, 8), (hardness, r, more, t) => {
      for (const k of [genericK(hardness, mm(r), mm(t)), grooverK(mm(r), mm(t))]) {
        expect(k).toBeGreaterThan(0);
        expect(k).toBeLessThanOrEqual(0.5);
      }
      expect(genericK(hardness, mm(r + more), mm(t))).toBeGreaterThanOrEqual(genericK(hardness, mm(r), mm(t)));
      expect(grooverK(mm(r + more), mm(t))).toBeGreaterThanOrEqual(grooverK(mm(r), mm(t)));
    }));
  });

  test("between the printed entries of the measured table there is no value", () => {
    const inch = (value: number) => mm(value * MM_PER_INCH);
    expect(empiricalK("stainless", inch(0.06), inch(0.078))).toBe(0.446);
    expect(empiricalK("stainless", inch(0.07), inch(0.078))).toBeNull();
    expect(empiricalK("stainless", inch(0.06), inch(0.05))).toBeNull();
  });
});
