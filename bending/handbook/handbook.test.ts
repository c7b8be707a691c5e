import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { deg, mm, mpa, rad, toRad } from "../core/units";
import { builtInMaterials } from "./materials";
import { din6935CompensatingValue } from "./din6935CompensatingValue";
import { resolveAllowance } from "./resolveAllowance";
import { springback } from "./springback";
import { springbackRatio } from "./springbackRatio";

const thickness = fc.double({ min: 0.3, max: 12, noNaN: true }).map(mm);
const material = fc.constantFrom(...builtInMaterials);

describe("where an allowance comes from", () => {
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

describe("springback", () => {
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
