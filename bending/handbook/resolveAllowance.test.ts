import { describe, expect, test } from "vitest";
import { deg, mm, toRad } from "../core/units";
import type { BendTrial } from "../shopTable/bendTrial";
import { shopTable } from "../shopTable/shopTable";
import { materialById } from "./materials";
import { resolveAllowance, type AllowanceQuestion } from "./resolveAllowance";

const steel = materialById("S235")!;
const trial = (id: string, blankLength: number, changes: Partial<BendTrial> = {}): BendTrial => ({
  id, units: "mm", material: "S235", batch: "", thickness: 2, vOpening: 12, punchRadius: 0.8, angle: 90, flanges: [60, 40], blankLength, measuredOn: "2026-11-30",
  instruments: { length: { uncertainty: 0.03, resolution: 0.01 }, angle: { uncertainty: 0.1, resolution: 0 } }, ...changes,
});
const table = shopTable([trial("a", 96.28), trial("b", 96.32), trial("c", 95.2, { vOpening: 20 })], materialById);
const shop = { table, vOpening: mm(12), openingFrom: "die" } as const;
const bend: AllowanceQuestion = { material: steel, thickness: mm(2), insideRadius: mm(2), angle: toRad(deg(90)), shop };
const order = (question: AllowanceQuestion) => {
  const { basis } = resolveAllowance(question);
  return [basis.kind, basis.next?.kind ?? null];
};

describe("where a bend's allowance comes from", () => {
  test("a K by hand, the closed hem, the rule that is named, the shop, the material's rule, in this order", () => {
    expect(order({ ...bend, kOverride: 0.44 })).toEqual(["override", "shop"]);
    expect(order({ ...bend, closedHem: true })).toEqual(["closed hem", "shop"]);
    expect(order({ ...bend, rule: "faa" })).toEqual(["handbook", "shop"]);
    expect(order({ ...bend, rule: "shop" })).toEqual(["shop", "handbook"]);
    expect(order(bend)).toEqual(["shop", "handbook"]);
    expect(order({ ...bend, shop: undefined })).toEqual(["handbook", null]);
    expect(order({ ...bend, shop: { ...shop, vOpening: mm(16) } })).toEqual(["shop interpolated", "handbook"]);
  });

  test("the shop's value is the deduction that was measured, and it stays so for another inside radius on that V", () => {
    for (const insideRadius of [mm(1.5), mm(2), mm(2.5)]) {
      const found = resolveAllowance({ ...bend, insideRadius });
      expect(found.deduction).toBeCloseTo(3.7, 9);
      expect(found.allowance).toBeCloseTo(2 * (insideRadius + 2) - 3.7, 9);
      expect(found.allowance).toBeCloseTo((Math.PI / 2) * (insideRadius + found.k * 2), 9);
    }
  });

  test("what the next source would have said is what it says alone", () => {
    const alone = resolveAllowance({ ...bend, shop: undefined });
    expect(resolveAllowance(bend).basis.next).toMatchObject({ text: "DIN 6935", deduction: alone.deduction, k: alone.k });
    expect(resolveAllowance({ ...bend, kOverride: 0.5 }).basis.next).toMatchObject({ text: "shop value of 2 trials", deduction: expect.closeTo(3.7, 9) });
  });

  test("number of trials, scatter, day and V come along; between neighbours they are named", () => {
    expect(resolveAllowance(bend).basis.shop).toMatchObject({ count: 2, spread: expect.closeTo(0.04 / Math.SQRT2, 6), lastMeasured: "2026-11-30", vOpening: 12, openingFrom: "die" });
    const between = resolveAllowance({ ...bend, shop: { ...shop, vOpening: mm(16) } });
    expect(between.source).toBe("between shop values, 3 trials");
    expect(between.basis.shop?.places.map(({ vOpening, weight }) => [vOpening, weight])).toEqual([[12, 0.5], [20, 0.5]]);
  });

  test("an inside radius that this V cannot bend is not the shop's", () => {
    expect(order({ ...bend, insideRadius: mm(8) })).toEqual(["handbook", null]);
  });
});
