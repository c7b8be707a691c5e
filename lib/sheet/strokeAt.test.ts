import { expect, it } from "vitest";
import { strokeAt } from "./strokeAt";

it("comes down flat, bends to the demanded angle, springs back to the finished one and goes up", () => {
  expect(strokeAt(0, 1.6, 1.5)).toEqual({ angle: 0, lift: 70 });
  expect(strokeAt(0.15, 1.6, 1.5)).toEqual({ angle: 0, lift: 0 });
  expect(strokeAt(0.8, 1.6, 1.5)).toEqual({ angle: 1.6, lift: 0 });
  expect(strokeAt(1, 1.6, 1.5)).toEqual({ angle: expect.closeTo(1.5), lift: 70 });
});
