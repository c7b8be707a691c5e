import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { deg, mm, rad, toRad } from "../core/units";
import { hemDeduction } from "./hemDeduction";
import { hemSteps } from "./hemSteps";
import { holeOverDie } from "./holeOverDie";
import { holeToBend } from "./holeToBend";
import { radiusBySteps } from "./radiusBySteps";
import { radiusByRule } from "./radiusByRule";
import { radiusRules } from "./radiusRules";
import { reliefSize } from "./reliefSize";
import { resolveAllowance } from "./resolveAllowance";
import { sharpBendLimit } from "./sharpBendLimit";
import { vOpeningChart } from "./vOpeningChart";
import { vOpeningRule } from "./vOpeningRule";
import { builtInMaterials } from "./materials";

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });

describe("openings and radii", () => {
  test("the metric chart is the rule in use, and says where it is silent", () => {
    fc.assert(fc.property(between(0.3, 25), (t) => {
      expect(vOpeningChart(mm(t)).vOpening).toBeCloseTo(vOpeningRule(mm(t)), 9);
    }));
    expect(vOpeningChart(mm(2.8)).betweenRows).toBe(true);
    expect(vOpeningChart(mm(3)).betweenRows).toBe(false);
    expect(vOpeningChart(mm(0.4), "second").betweenRows).toBe(true);
    expect(vOpeningChart(mm(12), "second").betweenRows).toBe(true);
    expect(vOpeningChart(mm(11), "second")).toMatchObject({ times: 12, betweenRows: true });
  });

  test("a thicker sheet never gets a smaller V", () => {
    fc.assert(fc.property(fc.constantFrom("metric", "inch", "second"), between(0.3, 25), between(0, 5), (chart, t, more) => {
      expect(vOpeningChart(mm(t + more), chart).vOpening).toBeGreaterThanOrEqual(vOpeningChart(mm(t), chart).vOpening);
    }));
  });

  test("every rule's usual radius in the usual V is over the sharp limit", () => {
    for (const rule of radiusRules) {
      for (const t of [1, 2, 4, 10]) expect(radiusByRule(rule, vOpeningRule(mm(t)))[1]).toBeGreaterThan(sharpBendLimit(mm(t)));
    }
  });
});

describe("hems", () => {
  test("a closed hem has the deduction that flat patterns are made with", () => {
    const [steel] = builtInMaterials;
    if (!steel) throw new Error("no material");
    fc.assert(fc.property(between(0.4, 4), (t) => {
      const used = resolveAllowance({ material: steel, thickness: mm(t), insideRadius: mm(0), angle: toRad(deg(180)), closedHem: true });
      expect(hemDeduction(mm(t))).toBeCloseTo(used.deduction, 9);
    }));
  });

  test("pre-bend angles left and turned make a half turn, and thick sheet does not suit a two-stage die", () => {
    const steps = hemSteps(mm(1.5));
    expect(steps.preBendOpening[0] + steps.preBendTurned[1]).toBe(180);
    expect(steps.preBendOpening[1] + steps.preBendTurned[0]).toBe(180);
    expect(steps.suitsTwoStageDie).toBe(true);
    expect(hemSteps(mm(2.5)).suitsTwoStageDie).toBe(false);
  });
});

describe("a radius by steps", () => {
  test("the hits add up to the whole angle and length, and no step is coarser than asked", () => {
    fc.assert(fc.property(between(0.2, 3), between(20, 500), between(0.5, 6), between(0.3, 0.5), between(0.5, 6), (angle, radius, t, k, degrees) => {
      const step = toRad(deg(degrees));
      const found = radiusBySteps(rad(angle), mm(radius), mm(t), k, { angle: step });
      expect(found.hits * found.anglePerHit).toBeCloseTo(angle, 9);
      expect(found.hits * found.pitch).toBeCloseTo(found.neutralArc, 7);
      expect(found.anglePerHit).toBeLessThanOrEqual(step + 1e-9);
      expect((found.hits - 1) * step).toBeLessThan(angle + 1e-9);
      const byPitch = radiusBySteps(rad(angle), mm(radius), mm(t), k, { insidePitch: mm(radius * step) });
      expect(byPitch.hits).toBe(found.hits);
    }));
  });

  test("the facet height is the chord's distance from the sampled arc", () => {
    const found = radiusBySteps(toRad(deg(90)), mm(100), mm(3), 0.44);
    const half = found.anglePerHit / 2;
    const chord = 100 * Math.cos(half);
    let farthest = 0;
    for (let i = -50; i <= 50; i += 1) farthest = Math.max(farthest, 100 * Math.cos((half * i) / 50) - chord);
    expect(found.facetHeight).toBeCloseTo(farthest, 9);
  });
});

describe("holes and reliefs", () => {
  test("a longer slot never comes nearer, and the cautious distance is not the smaller", () => {
    fc.assert(fc.property(between(1, 200), between(0, 100), between(0.5, 6), between(0, 20), (length, more, t, r) => {
      const near = holeToBend({ kind: "slot", length: mm(length) }, mm(t), mm(r));
      const far = holeToBend({ kind: "slot", length: mm(length + more) }, mm(t), mm(r));
      expect(far.least).toBeGreaterThanOrEqual(near.least);
      expect(near.cautious).toBeGreaterThanOrEqual(near.least);
    }));
  });

  test("a hole at the edge of the V is not over it", () => {
    expect(holeOverDie(mm(7.9), mm(16))).toBe(true);
    expect(holeOverDie(mm(8), mm(16))).toBe(false);
  });

  test("a relief clears the whole bend", () => {
    const relief = reliefSize(mm(2), mm(3));
    expect(relief).toEqual({ width: [2, 3], depth: [5, 5.5] });
  });
});
