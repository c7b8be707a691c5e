import { expect, test } from "vitest";
import { polygonBounds } from "../geometry/polygonBounds";
import type { PartDocument } from "../part/partDocument";
import { built } from "./trial/found";
import { zonePlates } from "./zonePlates";

/** A flat of 120 x 80 with one bend, and a window of 20 that reaches over the bend in the middle. */
const document: PartDocument = {
  format: "part/1", name: "Window", units: "mm", material: "S235", thickness: 2, insideRadius: 2,
  flat: { outline: [[0, 0], [120, 0], [120, 80], [0, 80]], bends: [{ id: "b1", line: [[60, 0], [60, 80]], angle: 90, direction: "up" }] },
};

test("a notched bend is the plates of what is left of it, where the whole bend has its own", () => {
  const part = built(document);
  const bend = part.bends[0];
  if (!bend) throw new Error("no bend");
  const whole = zonePlates(part, 0);
  const { min, max } = polygonBounds(bend.zone);
  const strip = (from: number, to: number) => ({ outline: [[min[0], from], [max[0], from], [max[0], to], [min[0], to]] as const, holes: [] });
  const notched = zonePlates({ ...part, bends: [{ ...bend, region: [strip(0, 30), strip(50, 80)] }] }, 0);
  expect(notched).toHaveLength(2 * whole.length);
  const ys = notched.flatMap(({ outside, inside }) => [...outside, ...inside]).map(([, y]) => y);
  expect([...new Set(ys.map((y) => Math.round(y * 1e6) / 1e6))].sort((a, b) => a - b)).toEqual([0, 30, 50, 80]);
  const [of, sides] = [(plates: typeof whole) => plates.flatMap(({ outside, inside }) => [...outside, ...inside]), (list: readonly (readonly number[])[]) => [0, 2].map((axis) => [Math.min(...list.map((p) => p[axis] ?? NaN)), Math.max(...list.map((p) => p[axis] ?? NaN))])];
  sides(of(notched)).flat().forEach((value, i) => expect(value).toBeCloseTo(sides(of(whole)).flat()[i] ?? NaN, 9));
});
