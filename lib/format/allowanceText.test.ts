import { describe, expect, it } from "vitest";
import type { ShopPlace } from "@/bending/shopTable/shopAnswer";
import type { Plain } from "@/bending/core/plain";
import { allowanceText } from "./allowanceText";
import { flatChangeText } from "./flatChangeText";

const numbers = { allowance: 4.1, deduction: 3.9, k: 0.4 };
const place = (changes: Partial<Plain<ShopPlace>>): Plain<ShopPlace> => ({ thickness: 2, vOpening: 12, angle: 90, punchRadii: [0.8], count: 3, lastMeasured: "2026-11-30", weight: 0.5, ...changes });
const shop = (...places: readonly Plain<ShopPlace>[]) => ({ count: 5, spread: 0.02, expanded: 0.0381, lastMeasured: "2026-11-30", vOpening: 16, openingFrom: "die" as const, places });
const between = (...places: readonly Plain<ShopPlace>[]) => allowanceText({ ...numbers, kind: "shop interpolated", text: "", shop: shop(...places) }, "mm");

describe("where an allowance is from, in a few words", () => {
  it("names the source", () => {
    const said = (kind: "override" | "closed hem" | "handbook", text: string) => allowanceText({ ...numbers, kind, text, shop: null }, "mm");
    expect([said("override", "K entered by hand"), said("closed hem", ""), said("handbook", "DIN 6935")]).toEqual(["K by hand", "closed hem, common practice", "DIN 6935"]);
  });

  it("says how many trials and how sure, in the part's unit", () => {
    const basis = { ...numbers, kind: "shop" as const, text: "", shop: shop(place({ weight: 1 })) };
    expect([allowanceText(basis, "mm"), allowanceText(basis, "in")]).toEqual(["shop, 5 trials, ±0.04 mm", "shop, 5 trials, ±0.002 in"]);
    expect(allowanceText({ ...basis, shop: { ...basis.shop, count: 1 } }, "mm")).toBe("shop, 1 trial, ±0.04 mm");
  });

  it("names the neighbours by what they differ in", () => {
    expect(between(place({}), place({ vOpening: 20 }))).toBe("between shop values V 12 and V 20 mm, ±0.04 mm");
    expect(between(place({ angle: 60 }), place({}))).toBe("between shop values 60° and 90°, ±0.04 mm");
    expect(between(place({ thickness: 1.5 }), place({ thickness: 2.5, vOpening: 20 }))).toBe("between shop values 1.5 and 2.5 mm thick, V 12 and V 20 mm, ±0.04 mm");
  });
});

describe("a flat that changed", () => {
  it("shows the side that changed, in as many decimals as tell it from before", () => {
    expect(flatChangeText({ units: "mm", thenMm: [172.32, 150], nowMm: [172.41, 150] })).toEqual({ then: "172.32 mm", now: "172.41 mm" });
    expect(flatChangeText({ units: "mm", thenMm: [172.321, 150], nowMm: [172.324, 150] })).toEqual({ then: "172.321 mm", now: "172.324 mm" });
    expect(flatChangeText({ units: "in", thenMm: [254, 127], nowMm: [254.254, 127.254] })).toEqual({ then: "10.000 × 5.000 in", now: "10.010 × 5.010 in" });
  });
});
