import { expect, test } from "vitest";
import { guessFacts } from "./import/guessFacts";

const materials = ["S235", "1.4301", "AW-5754-H22"];

test.each([
  ["Bracket_2mm_S235.dxf", [], 2, "mm", "S235"],
  ["cover t1.5.dxf", [], 1.5, "mm", null],
  ["P-1004.dxf", ["Material: 1.4301", "THK = 3"], 3, "mm", "1.4301"],
  ["P-1004.dxf", ["Dicke: 0,8 mm"], 0.8, "mm", null],
  ["P-1004.dxf", ['t = .06 in', "AW-5754-H22"], 0.06, "in", "AW-5754-H22"],
  ["Part 12 rev 3.dxf", ["SCALE 1:2", "DATE 2026"], null, null, null],
  ["tray 300mm.dxf", ["S2355"], null, null, null],
] as const)("%s %j", (file, texts, value, unit, material) => {
  const guess = guessFacts(file, texts, materials);
  expect([guess.thickness?.value ?? null, guess.thickness?.unit ?? null, guess.material]).toEqual([value, unit, material]);
});
