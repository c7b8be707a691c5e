import { expect, it } from "vitest";
import { parseQuantity } from "@/lib/format/parseQuantity";
import { keepUnit } from "./keepUnit";

it.each([["2", "2 mm"], ["3-1/2", "3-1/2 mm"], ["1 1/2", "1 1/2 mm"], ["40 + 100", "(40 + 100) mm"], ["(1+2)*3", "((1+2)*3) mm"], ["1e3", "1e3 mm"], ["16 ga", "16 ga"], ["2 in", "2 in"], ['2"', '2"'], ["", ""]])(
  "keeps the size of '%s' when the units change", (typed, kept) => {
    expect(keepUnit(typed, "length", "mm")).toBe(kept);
    expect(parseQuantity(kept, "length", { system: "in", gaugeGroup: "steel" })).toEqual(parseQuantity(typed, "length", { system: "mm", gaugeGroup: "steel" }));
  });

it("leaves angles and plain numbers as they are", () => {
  expect(keepUnit("90", "angle", "mm")).toBe("90");
  expect(keepUnit("0.44", "ratio", "in")).toBe("0.44");
  expect(keepUnit("65", "stress", "in")).toBe("65 ksi");
});
