import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { deg, mm, MM_PER_INCH, toDeg, toRad, type LengthUnit } from "../core/units";
import { bendAllowance } from "../handbook/bendAllowance";
import { bendDeduction } from "../handbook/bendDeduction";
import { materialById } from "../handbook/materials";
import type { BendTrial } from "./bendTrial";
import { evaluateTrial } from "./evaluateTrial";
import { excludeTrial } from "./excludeTrial";
import { includeTrial } from "./includeTrial";
import { shopTable } from "./shopTable";
import { shopValue } from "./shopValue";

const steel = materialById("S235")!;
const RADIUS_PER_V = steel.naturalRadiusRatio;

interface Bend { readonly k: number; readonly thickness: number; readonly v: number; readonly angle: number }

/** The trial that a sheet with this K gives on the V's natural radius, in the unit asked for. */
function trialOf({ k, thickness, v, angle }: Bend, changes: Partial<BendTrial> = {}, units: LengthUnit = "mm"): BendTrial {
  const [t, r, a] = [mm(thickness), mm(RADIUS_PER_V * v), toRad(deg(angle))];
  const leg = 5 * (r + t) + 30;
  const per = units === "in" ? MM_PER_INCH : 1;
  const inUnits = (value: number) => value / per;
  return {
    id: "T-1", units, material: "S235", batch: "7", nominalThickness: inUnits(thickness), thickness: inUnits(thickness), vOpening: inUnits(v), punchRadius: inUnits(0.5), angle,
    blankLength: inUnits(2 * leg - bendDeduction(a, r, t, bendAllowance(a, r, k, t))), flanges: [inUnits(leg), inUnits(leg)],
    instruments: { length: { uncertainty: inUnits(0.03), resolution: inUnits(0.01) }, angle: { uncertainty: 0.0833, resolution: 0 } },
    measuredOn: "2026-11-30", ...changes,
  };
}

const bend = fc.record({
  k: fc.double({ min: 0.2, max: 0.6, noNaN: true }), thickness: fc.double({ min: 0.5, max: 6, noNaN: true }),
  v: fc.double({ min: 6, max: 12, noNaN: true }), angle: fc.double({ min: 10, max: 150, noNaN: true }),
}).map((b): Bend => ({ ...b, v: b.v * b.thickness }));

const evaluated = (trial: BendTrial) => {
  const result = evaluateTrial(trial, steel);
  if (!result.ok) throw new Error(JSON.stringify(result.error));
  return result.value;
};
const table = (trials: readonly BendTrial[]) => shopTable(trials, materialById);
const asked = ({ thickness, v, angle }: Omit<Bend, "k">) => ({ material: "S235", thickness: mm(thickness), vOpening: mm(v), angle: toRad(deg(angle)) });

describe("a trial", () => {
  test("of a known K gives that K back, and deduction, allowance and K agree", () => {
    fc.assert(fc.property(bend, (b) => {
      const { k, deduction, allowance, insideRadius } = evaluated(trialOf(b));
      expect(k.value).toBeCloseTo(b.k, 6);
      expect(insideRadius).toEqual({ value: RADIUS_PER_V * b.v, source: "natural radius of the V" });
      expect(bendDeduction(toRad(deg(b.angle)), insideRadius.value, mm(b.thickness), mm(allowance.value))).toBeCloseTo(deduction.value, 9);
    }));
  });

  test("is the same in inches and in millimetres", () => {
    fc.assert(fc.property(bend, (b) => {
      const [inMm, inInches] = [evaluated(trialOf(b)), evaluated(trialOf(b, {}, "in"))];
      expect(inInches.k.value).toBeCloseTo(inMm.k.value, 7);
      expect(inInches.k.standard).toBeCloseTo(inMm.k.standard, 7);
      expect(inInches.deduction.expanded).toBeCloseTo(inMm.deduction.expanded, 7);
      expect(inInches.thicknessClass).toBe(inMm.thicknessClass);
    }));
  });

  test("has the partial derivatives that its results have", () => {
    const fields = { "flanges[0]": 1e-4, "flanges[1]": 1e-4, blankLength: 1e-4, thickness: 1e-5, angle: 1e-4, insideRadius: 1e-4 } as const;
    fc.assert(fc.property(bend.filter(({ angle }) => Math.abs(angle - 90) > 0.01), (b) => {
      const trial = trialOf(b, { insideRadius: 1.2 * RADIUS_PER_V * b.v, instruments: { ...trialOf(b).instruments, radius: { uncertainty: 0.1, resolution: 0 } } });
      const { budget } = evaluated(trial);
      for (const line of budget) {
        const step = fields[line.of];
        const moved = (by: number): BendTrial => line.of === "flanges[0]" ? { ...trial, flanges: [trial.flanges[0] + by, trial.flanges[1]] }
          : line.of === "flanges[1]" ? { ...trial, flanges: [trial.flanges[0], trial.flanges[1] + by] }
          : line.of === "angle" ? { ...trial, angle: trial.angle + toDeg(by as never) } : { ...trial, [line.of]: (trial[line.of] ?? 0) + by };
        const [less, more] = [evaluated(moved(-step)), evaluated(moved(step))];
        for (const [partial, of] of [[line.onDeduction, "deduction"], [line.onAllowance, "allowance"], [line.onK, "k"]] as const) {
          const slope = (more[of].value - less[of].value) / (2 * step);
          expect(Math.abs(slope - partial) / (1 + Math.abs(partial))).toBeLessThan(1e-4);
        }
      }
    }), { numRuns: 40 });
  });

  test("worked by hand: 2 mm, V 12, 60.02 + 40.01 - 96.20", () => {
    const { deduction, k, allowance } = evaluated(trialOf({ k: 0.4, thickness: 2, v: 12, angle: 90 }, { flanges: [60.02, 40.01], blankLength: 96.2 }));
    expect(deduction.value).toBeCloseTo(3.83, 9);
    // Each reading: 0.03 / sqrt 3 and 0.01 / sqrt 12 are 0.01756; three of them 0.03041, doubled 0.0608.
    expect(deduction.expanded).toBeCloseTo(0.0608, 4);
    expect(allowance.value).toBeCloseTo(8 - 3.83, 9);
    expect(k.value).toBeCloseTo((4.17 / (Math.PI / 2) - 2) / 2, 9);
  });

  test("takes the punch's radius for a punch rounder than the V's natural radius", () => {
    expect(evaluated(trialOf({ k: 0.4, thickness: 2, v: 12, angle: 90 }, { punchRadius: 3 })).insideRadius).toEqual({ value: 3, source: "punch radius" });
  });

  test.each([
    ["blankLength", { blankLength: 90 }, "a blank of"], ["blankLength", { blankLength: 0 }, "must be over 0"], ["flanges[1]", { flanges: [60, 2] as const }, "the bend alone takes 4 mm"],
    ["angle", { angle: 180 }, "under 180 degrees"], ["vOpening", { vOpening: 3 }, "does not go into a V of 4 mm"], ["punchRadius", { punchRadius: 7 }, "less than half of it, 6 mm"],
    ["thickness", { nominalThickness: 3 }, "2.4 mm to 3.6 mm"], ["measuredOn", { measuredOn: "2026-02-30" }, "2026-12-01"], ["instruments.radius", { insideRadius: 2 }, "what the inside radius was measured with"],
    ["instruments.length", { instruments: { length: { uncertainty: 0, resolution: 0.01 }, angle: { uncertainty: 0.1, resolution: 0 } } }, "over 0 mm"],
    ["thickness", { thickness: NaN }, "must be over 0"],
  ])("that cannot be true names %s and what would be right", (path, changes, words) => {
    const result = evaluateTrial(trialOf({ k: 0.4, thickness: 2, v: 12, angle: 90 }, changes), steel);
    if (result.ok) throw new Error("it was taken");
    expect(result.error).toEqual([{ path, message: expect.stringContaining(words) }]);
  });
});

describe("the table", () => {
  const five = [0.38, 0.41, 0.4, 0.42, 0.39].map((k, i) => trialOf({ k, thickness: 2, v: 12, angle: 89 + i / 2 }, { id: `T-${i}`, measuredOn: `2026-11-0${i + 1}` }));

  test("mean, scatter, number, day and uncertainty of a cell", () => {
    const [cell, ...others] = table(five).cells;
    expect(others).toEqual([]);
    expect(cell).toMatchObject({ material: "S235", thickness: 2, vOpening: 12, punchRadius: 0.5, angle: 90, angles: [87.5, 92.5], radius: 2, outliersTold: true });
    expect(cell?.value).toMatchObject({ count: 5, k: expect.closeTo(0.4, 6), spreadK: expect.closeTo(Math.sqrt(0.00025), 6), lastMeasured: "2026-11-05" });
    expect(cell?.value?.deduction.value).toBeCloseTo(8 - (Math.PI / 2) * 2.8, 6);
    expect(cell?.value?.spread).toBeCloseTo(Math.PI * Math.sqrt(0.00025), 6);
    const instruments = (cell?.value?.instrumentsK ?? NaN) * Math.PI;
    expect(cell?.value?.deduction.expanded).toBeCloseTo(2 * Math.hypot((Math.PI * Math.sqrt(0.00025)) / Math.sqrt(5), instruments), 6);
  });

  test("does not depend on the order of the trials", () => {
    const many = [...five, ...five.map((trial) => ({ ...trial, id: `${trial.id}b`, vOpening: 16, blankLength: trial.blankLength - 1 }))];
    fc.assert(fc.property(fc.shuffledSubarray(many, { minLength: many.length }), (shuffled) => { expect(table(shuffled)).toEqual(table(many)); }), { numRuns: 30 });
  });

  test("every trial is found again: counted, excluded or refused", () => {
    const wrong = trialOf({ k: 0.4, thickness: 2, v: 12, angle: 90 }, { id: "wrong", blankLength: 50 });
    const foreign = { ...five[0]!, id: "foreign", material: "oak" };
    const { cells, refused } = table([...five, wrong, foreign]);
    expect([...cells.flatMap(({ trials }) => trials.map(({ id }) => id)), ...refused.map(({ trial }) => trial)].sort()).toEqual(["T-0", "T-1", "T-2", "T-3", "T-4", "foreign", "wrong"]);
  });

  test("an outlier is marked and counts until a person leaves it out, with a reason; back in, all is as before", () => {
    const apart = trialOf({ k: 0.6, thickness: 2, v: 12, angle: 90 }, { id: "apart" });
    const before = table([...five, apart]);
    const marked = before.cells[0]!;
    expect(marked.trials.filter(({ outlier }) => outlier).map(({ id }) => id)).toEqual(["apart"]);
    expect(marked.value?.count).toBe(6);
    expect(excludeTrial(apart, { reason: "  ", by: "Greta", on: "2026-12-01" })).toMatchObject({ ok: false, error: { path: "reason" } });
    const without = excludeTrial(apart, { reason: "the strip slipped", by: "Greta", on: "2026-12-01" });
    if (!without.ok) throw new Error("a reason was given");
    const after = table([...five, without.value]).cells[0]!;
    expect(after.value).toEqual(table(five).cells[0]!.value);
    expect(after.trials.find(({ id }) => id === "apart")?.excluded?.reason).toBe("the strip slipped");
    expect(table([...five, includeTrial(without.value)])).toEqual(before);
  });

  test("of two trials none is called the one apart, and close agreement makes no outlier of what instruments cannot tell", () => {
    const two = table([trialOf({ k: 0.3, thickness: 2, v: 12, angle: 90 }), trialOf({ k: 0.5, thickness: 2, v: 12, angle: 90 }, { id: "T-2" })]).cells[0]!;
    expect([two.outliersTold, two.trials.some(({ outlier }) => outlier)]).toEqual([false, false]);
    const near = [0.4, 0.4, 0.4, 0.4, 0.403].map((k, i) => trialOf({ k, thickness: 2, v: 12, angle: 90 }, { id: `T-${i}` }));
    expect(table(near).cells[0]!.trials.some(({ outlier }) => outlier)).toBe(false);
  });

  test("one V has one inside radius: a measured one serves every angle, and the deductions stay what was measured", () => {
    const measured = trialOf({ k: 0.4, thickness: 2, v: 12, angle: 90 }, { id: "r", insideRadius: 2.4, instruments: { ...five[0]!.instruments, radius: { uncertainty: 0.1, resolution: 0 } } });
    const flatter = trialOf({ k: 0.4, thickness: 2, v: 12, angle: 30 }, { id: "30" });
    const { cells } = table([measured, flatter]);
    expect(cells.map(({ angle, radius, radiusSource }) => [angle, radius, radiusSource])).toEqual([[30, 2.4, "measured"], [90, 2.4, "measured"]]);
    expect(cells.map(({ value }) => value?.deduction.value)).toEqual([flatter, measured].map((trial) => expect.closeTo(evaluated(trial).deduction.value, 9)));
  });
});

describe("a value", () => {
  const at = (v: number, angle: number, k: number, thickness = 2) => trialOf({ k, thickness, v, angle }, { id: `${thickness} ${v} ${angle}` });

  test("of a measured place is what was measured there, at the angle and thickness asked for", () => {
    const value = shopValue(table([at(12, 90, 0.4)]), asked({ thickness: 2, v: 12, angle: 91 }));
    expect(value).toMatchObject({ interpolated: false, count: 1, spread: null, k: expect.closeTo(0.4, 9), places: [{ vOpening: 12, angle: 90, weight: 1 }] });
    const turned = toRad(deg(91));
    expect(value?.deduction).toBeCloseTo(bendDeduction(turned, mm(2), mm(2), bendAllowance(turned, mm(2), 0.4, mm(2))), 9);
  });

  test("between neighbours stays between them, whichever of angle, V and thickness lies between", () => {
    const k = fc.double({ min: 0.25, max: 0.55, noNaN: true });
    const part = fc.double({ min: 0.05, max: 0.95, noNaN: true });
    fc.assert(fc.property(k, k, part, fc.constantFrom("angle", "v", "thickness"), (low, high, share, axis) => {
      const [a, b] = axis === "angle" ? [at(12, 60, low), at(12, 100, high)] : axis === "v" ? [at(10, 90, low), at(16, 90, high)] : [at(16, 90, low, 1.5), at(16, 90, high, 2.5)];
      const mix = (from: number, to: number) => from + (to - from) * share;
      const question = asked({ thickness: axis === "thickness" ? mix(1.5, 2.5) : 2, v: axis === "angle" ? 12 : axis === "v" ? mix(10, 16) : 16, angle: axis === "angle" ? mix(60, 100) : 90 });
      const value = shopValue(table([a, b]), question);
      // A place within the tolerance of one neighbour is that neighbour's.
      if (value?.interpolated === false) return;
      expect(value?.places.map(({ weight }) => weight)).toEqual([expect.closeTo(1 - share, 6), expect.closeTo(share, 6)]);
      const ends = [a, b].map((trial) => {
        const alone = evaluated(trial);
        return bendDeduction(question.angle, alone.insideRadius.value, question.thickness, bendAllowance(question.angle, alone.insideRadius.value, alone.k.value, question.thickness));
      });
      expect(value?.deduction).toBeGreaterThanOrEqual(Math.min(...ends) - 1e-9);
      expect(value?.deduction).toBeLessThanOrEqual(Math.max(...ends) + 1e-9);
      expect(value?.k).toBeGreaterThanOrEqual(Math.min(low, high) - 1e-6);
      expect(value?.k).toBeLessThanOrEqual(Math.max(low, high) + 1e-6);
      expect(value?.standard).toBeGreaterThanOrEqual(Math.abs((ends[0] ?? 0) - (ends[1] ?? 0)) / Math.sqrt(12) - 1e-9);
    }));
  });

  test("that is not measured is never guessed: beyond the last neighbour, across too wide a gap, of another material", () => {
    const shop = table([at(12, 90, 0.4), at(16, 90, 0.4), at(40, 90, 0.4), at(12, 20, 0.4)]);
    expect(shopValue(shop, asked({ thickness: 2, v: 11, angle: 90 }))).toBeUndefined();
    expect(shopValue(shop, asked({ thickness: 2, v: 12, angle: 95 }))).toBeUndefined();
    expect(shopValue(shop, asked({ thickness: 2, v: 12, angle: 45 }))).toBeUndefined();
    expect(shopValue(shop, asked({ thickness: 2, v: 25, angle: 90 }))).toBeUndefined();
    expect(shopValue(shop, asked({ thickness: 2.2, v: 12, angle: 90 }))).toBeUndefined();
    expect(shopValue(shop, { ...asked({ thickness: 2, v: 12, angle: 90 }), material: "1.4301" })).toBeUndefined();
    expect(shopValue(shop, asked({ thickness: 2, v: 14, angle: 90 }))?.interpolated).toBe(true);
  });

  test("of a place whose trials are all left out is none", () => {
    const left = excludeTrial(at(12, 90, 0.4), { reason: "wrong sheet", by: "Greta", on: "2026-12-01" });
    expect(left.ok && shopValue(table([left.value]), asked({ thickness: 2, v: 12, angle: 90 }))).toBeUndefined();
  });

  test("counts punches together whose radius follows from the V, and keeps a rounder punch to itself", () => {
    const trials = [0.5, 0.8].map((punchRadius) => ({ ...at(12, 90, punchRadius === 0.5 ? 0.39 : 0.41), id: `p${punchRadius}`, punchRadius }));
    const round = { ...at(12, 90, 0.3), id: "round", punchRadius: 3 };
    const shop = table([...trials, round]);
    const question = asked({ thickness: 2, v: 12, angle: 90 });
    expect(shopValue(shop, question)).toMatchObject({ count: 2, k: expect.closeTo(0.4, 6), places: [{ punchRadii: [0.5, 0.8] }] });
    expect(shopValue(shop, { ...question, punchRadius: mm(3) })).toMatchObject({ count: 1, radius: 3 });
    expect(shopValue(shop, { ...question, punchRadius: mm(5) })).toBeUndefined();
  });
});
