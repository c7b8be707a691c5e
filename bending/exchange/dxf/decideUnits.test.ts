import { expect, test } from "vitest";
import { circle, opened, rectangle } from "./fixtures/dxfText";

const units = (said: number | null, measurement: number | null, size: number, hole: number, texts: readonly string[] = []) => opened({
  header: [...(said === null ? [] : [[9, "$INSUNITS"], [70, said]] as const), ...(measurement === null ? [] : [[9, "$MEASUREMENT"], [70, measurement]] as const)],
  entities: [...rectangle(0, 0, size, size / 2), circle(size / 4, size / 4, hole), ...texts.map((text) => [[0, "TEXT"], [8, "0"], [10, 0], [20, 0], [1, text]] as const)],
}).units;

test.each([
  ["mm said and right", 4, 1, 250, 3, "mm", true],
  ["inch said and right", 1, 0, 9, 0.125, "in", true],
  ["a header that says inch over a drawing in mm", 1, 0, 132, 2.5, "mm", false],
  ["a header that says mm over a drawing in inch", 4, 1, 9, 0.125, "in", false],
  ["nothing said, sizes of mm", 0, null, 250, 3, "mm", false],
  ["nothing said, sizes of inches", null, null, 9, 0.125, "in", false],
  ["metres said and right", 6, 1, 0.4, 0.003, "m", true],
  ["centimetres said and right", 5, 1, 25, 0.3, "cm", true],
] as const)("%s", (_, said, measurement, size, hole, unit, sure) => {
  const decided = units(said, measurement, size, hole);
  expect([decided.unit, decided.sure]).toEqual([unit, sure]);
  expect(decided.reasons.length).toBeGreaterThan(0);
});

test("a header that says inch over a plain plate of 200 without holes is doubted", () => {
  const decided = opened({ header: [[9, "$INSUNITS"], [70, 1]], entities: rectangle(0, 0, 200, 100) }).units;
  expect([decided.unit, decided.sure, decided.header]).toEqual(["mm", false, "in"]);
});

test("a word on the drawing tips what is open", () => {
  expect(units(null, null, 30, 1, ["ALL DIMENSIONS IN INCHES"]).unit).toBe("in");
  expect(units(null, null, 30, 1, ["All dimensions in mm"]).unit).toBe("mm");
});
