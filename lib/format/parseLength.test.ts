import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { formatInchFraction } from "./formatInchFraction";
import { parseLength } from "./parseLength";

const value = (text: string, unit: "mm" | "in", group?: "steel" | "stainless" | "aluminium" | "copper") => {
  const read = parseLength(text, unit, { gaugeGroup: group });
  return read.ok ? read.value : read.error;
};

describe("parseLength", () => {
  it.each([
    ["12", "mm", 12], ["2,5", "mm", 2.5], [".5", "in", 0.5], ["1/8", "in", 0.125], ["3 1/2", "in", 3.5], ["3-1/2", "in", 3.5], ['3½"', "in", 3.5],
    ["2.5 mm", "in", 2.5 / 25.4], ["0.1 in", "mm", 2.54], ["1/8 in", "mm", 3.175], ["2 ft", "in", 24], ["-4", "mm", -4], ["60 thou", "in", 0.06], ["12mm", "mm", 12],
  ] as const)("reads %s in %s", (text, unit, expected) => expect(value(text, unit)).toBeCloseTo(expected, 9));

  it("reads sheet gauges by the material's own table", () => {
    expect(value("16 ga", "in", "steel")).toBe(0.0598);
    expect(value("16ga", "in", "stainless")).toBe(0.0625);
    expect(value("ga 16", "in", "aluminium")).toBe(0.0508);
    expect(value("16 gauge", "mm", "steel")).toBeCloseTo(1.51892, 9);
  });

  it.each([["", "Type a length"], ["abc", "not a unit"], ["1/0", "divides by zero"], ["1..2", "not a number"], ["16 ga", "sheet thickness only"], ["5 furlong", "Use mm"]])(
    "says what is wrong with '%s'", (text, part) => expect(value(text, "mm")).toContain(part));

  it("refuses a gauge that the table does not have", () => {
    expect(value("3 ga", "in", "steel")).toContain("from 7 to 30");
    expect(value("16 ga", "in", "copper")).toContain("no gauge table");
  });

  it("reads back every fraction that it writes", () => {
    fc.assert(fc.property(fc.integer({ min: -6400, max: 6400 }), (parts) => {
      expect(value(formatInchFraction(parts / 64), "in")).toBeCloseTo(parts / 64, 12);
    }));
  });
});
