import fc from "fast-check";
import { describe, expect, it } from "vitest";
import type { LengthUnit } from "@/bending/core/units";
import type { MaterialGroup } from "@/bending/handbook/material";
import { formatInchFraction } from "./formatInchFraction";
import { parseLength } from "./parseLength";
import { parseQuantity } from "./parseQuantity";
import { quantityKinds, type QuantityKind } from "./quantityKind";

const read = (text: string, kind: QuantityKind = "length", system: LengthUnit = "mm", gaugeGroup?: MaterialGroup) => {
  const result = parseQuantity(text, kind, { system, gaugeGroup });
  return result.ok ? result.value : result.error;
};

describe("parseQuantity", () => {
  it.each([
    ["12", 12], ["2,5", 2.5], [".5 in", 12.7], ["3/32 in", 2.38125], ["2*1.5 mm", 3], ['1 1/2"', 38.1], ["1-1/2 in", 38.1], ["3½\"", 88.9], ["(40+2) mm", 42], ["(40 + 2)", 42],
    ["1.2 m", 1200], ["2 ft 3 in", 685.8], ["2*2' 3\"", 1371.6], ["1/2 in + 3 mm", 15.7], ["2*3/32 in", 4.7625], ["20 + 40 + 20", 80], ["1e3 mm", 1000], ["60 thou", 1.524], ["10 - 1/2", 9.5],
    ["-3 mm", -3], ["2 × 3", 6], ["100 mm / 4", 25], ["1000 mm^2 / 10 mm", 100], ["2 * 1 1/2 in", 76.2], ["12 MM", 12], ["6' 2 1/2\"", 1892.3], ["2*pi*10 mm", 20 * Math.PI],
  ] as const)("reads %s as %d mm", (text, mm) => expect(read(text)).toBeCloseTo(mm, 8));

  it.each([
    ["60 deg", "angle", 60], ["90°", "angle", 90], ["180 - 60", "angle", 120], ["pi/2 rad", "angle", 90], ["65°24'30\"", "angle", 65 + 24.5 / 60], ["450 MPa", "stress", 450], ["450 N/mm²", "stress", 450],
    ["65 ksi", "stress", 448.159223], ["800 kN", "force", 800], ["90 tonf", "force", 800.679886], ["5 ton-force", "force", 44.482216], ["2 tf", "force", 19.6133], ["51 lb", "mass", 23.133211],
    ["7.85 g/cm³", "density", 7850], ["0.2836 lb/in^3", "density", 7850.0210], ["1/3", "ratio", 1 / 3], ["2+2", "count", 4],
  ] as const)("reads %s", (text, kind, expected) => expect(read(text, kind)).toBeCloseTo(expected, 3));

  it("reads a gauge by the material's table, or by the metal that is named", () => {
    expect(read("16 ga", "length", "mm", "steel")).toBeCloseTo(0.0598 * 25.4, 12);
    expect(read("16ga", "length", "in", "stainless")).toBeCloseTo(1.5875, 12);
    expect(read("2 * 16 ga", "length", "mm", "aluminium")).toBeCloseTo(2 * 0.0508 * 25.4, 12);
    expect(read("gauge 22 stainless", "length", "mm", "steel")).toBeCloseTo(25.4 / 32, 12);
    expect(read("16 ga")).toContain("16 ga steel, 16 ga stainless or 16 ga aluminium");
    expect(read("16 ga", "length", "mm", "brass")).toContain("no gauge table");
    expect(read("3 ga", "length", "mm", "steel")).toContain("from 7 to 30");
    expect(read("16 ga", "angle", "mm", "steel")).toContain("sheet thickness");
  });

  it.each([
    ["", "length", "is empty"], ["abc", "length", "not a unit"], ["12 kg", "length", "is a mass"], ["2 mm * 3 mm", "length", "is an area"], ["12 + 1 in", "length", "give both their units"],
    ["1/0", "length", "divides by zero"], ["3 mm 4", "length", "beside each other"], ["2 (3)", "length", "beside each other"], ["1,250 mm", "length", "thousands"], ["20 + 3-1/2", "length", "mixed number"],
    ["5 tons", "force", "2000 lbf"], ["2.5", "count", "not whole"], ["3 mm", "ratio", "is a length"], ["((1)", "length", "cannot be read"], ["5!", "length", '"!"'], ["1".repeat(81), "length", "longer than 80"],
    ["9^9^9", "length", "power"], ["1e400 mm", "length", "too large"], ["3 mm + 4 deg", "length", "do not measure the same"],
  ] as const)("says what is wrong with '%s' and what would be right", (text, kind, part) => {
    expect(read(text, kind)).toContain(part);
    expect(read(text, kind)).toContain(quantityKinds[kind].examples);
  });

  it.each(["a=1", "f(x)=x", "sqrt(4)", "import({})", "createUnit(\"x\")", "evaluate(\"1\")", "[1,2]", "{a:1}", "1;2", "'a'", "cos.constructor", "1:3", "2 to 3", "true", "i", "e", "x", "__proto__", "constructor", "parse", "5%", "1 == 1", "a ? b : c", "# 1"])(
    "has no way to '%s'", (text) => expect(read(text)).toBeTypeOf("string"));

  const kind = fc.constantFrom(...(Object.keys(quantityKinds) as QuantityKind[]));
  const bits = fc.array(fc.constantFrom("1", "2.5", "3/4", "1 1/2", " ", "(", ")", "+", "-", "*", "/", "^", "mm", " in", '"', "'", "°", "ga", "16 ga", "kg", "e", "pi", ",", "=", "µ", "½", "ton-force"), { maxLength: 40 }).map((all) => all.join(""));

  it("answers whatever is typed with a finite number or a reason", () => {
    fc.assert(fc.property(fc.oneof(bits, fc.string({ unit: "binary", maxLength: 120 }), fc.string({ maxLength: 120 })), kind, fc.constantFrom<LengthUnit>("mm", "in"), (text, asked, system) => {
      const result = parseQuantity(text, asked, { system, gaugeGroup: "steel" });
      if (result.ok) expect(Number.isFinite(result.value)).toBe(true);
      else expect(result.error).toMatch(/Type an? .+\.$/);
    }), { numRuns: 1500 });
  });

  it("has the same length whichever unit it is typed in", () => {
    fc.assert(fc.property(fc.integer({ min: 1, max: 99_999 }), (tenThousandths) => {
      const inches = tenThousandths / 10_000;
      const asInch = read(`${inches} in`);
      expect(read(`${inches}`, "length", "in")).toBe(asInch);
      expect(read(`${inches}"`)).toBe(asInch);
      expect(read(`${inches} * 25.4 mm`)).toBeCloseTo(Number(asInch), 9);
      expect(read(`${inches} * 1 in`, "length", "in")).toBe(asInch);
    }));
  });

  it("reads what a plain field reads, to the same number", () => {
    fc.assert(fc.property(fc.integer({ min: 0, max: 6400 }), fc.constantFrom("", " in", '"', " mm", " ft"), fc.constantFrom<LengthUnit>("mm", "in"), (parts, unit, system) => {
      const text = `${formatInchFraction(parts / 64)}${unit}`;
      const plain = parseLength(text, system);
      expect(read(text, "length", system)).toBeCloseTo(plain.ok ? plain.value * (system === "in" ? 25.4 : 1) : NaN, 8);
    }));
  });
});
