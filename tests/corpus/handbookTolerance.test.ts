import { expect, test } from "vitest";
import { mm } from "@/bending";
import { generalAngleTolerance } from "@/bending/handbook/generalAngleTolerance";
import { generalLengthTolerance } from "@/bending/handbook/generalLengthTolerance";
import { generalTolerance } from "@/lib/sheet/generalTolerance";

test("the sheet's medium class is the handbook's", () => {
  for (const size of [0.5, 3, 3.1, 6, 7, 30, 31, 120, 121, 400, 401, 1000, 1500, 2000, 2001, 4000]) {
    expect(generalTolerance("length", size)).toBe(generalLengthTolerance("m", mm(size))?.deviation);
    expect(generalTolerance("angle", size)).toBeCloseTo(generalAngleTolerance("m", mm(size))?.deviation ?? NaN, 12);
  }
  expect([generalTolerance("length", 0.4), generalLengthTolerance("m", mm(0.4))]).toEqual([null, null]);
});
