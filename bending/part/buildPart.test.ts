import { expect, test } from "vitest";
import { mm } from "../core/units";
import { materialById } from "../handbook/materials";
import { buildPart } from "./buildPart";
import { flatOverlaps } from "./flatOverlaps";
import { flatPattern } from "./flatPattern";
import { foldPoint } from "./foldPoint";
import { reroot } from "./reroot";
import { signedArea } from "../geometry/signedArea";
import type { PartDocument } from "./partDocument";
import type { PartModel } from "./partModel";

const profile: PartDocument = {
  format: "part/1", name: "Channel", units: "mm", material: "S235", thickness: 2,
  profile: { width: 100, legs: [40, 100, 40], bends: [{ angle: 90, direction: "up" }, { angle: 90, direction: "up" }] },
};
const tray = (flanges: NonNullable<PartDocument["flanges"]>): PartDocument => ({
  format: "part/1", name: "Tray", units: "mm", material: "S235", thickness: 1.5, insideRadius: 1.5,
  base: { outline: [[0, 0], [200, 0], [200, 120], [0, 120]] }, flanges,
});
const up = { angle: 90, direction: "up" } as const;

function build(document: PartDocument, radiusOf?: (id: string) => { radius: ReturnType<typeof mm>; source: string } | null): PartModel {
  const built = buildPart(document, { materials: materialById, ...(radiusOf ? { radiusOf } : {}) });
  if (!built.ok) throw new Error(JSON.stringify(built.error));
  return built.value;
}

test("flat lengths by DIN 6935: 180 - 2 x 3.837 and 80 - 1.919", () => {
  expect(flatPattern(build({ ...profile, insideRadius: 2 })).width).toBeCloseTo(172.325, 3);
  const angle: PartDocument = { ...profile, thickness: 1, insideRadius: 1, profile: { width: 100, legs: [50, 30], bends: [up] } };
  expect(flatPattern(build(angle)).width).toBeCloseTo(78.081, 3);
});

test("the flat is the legs less the deductions, whatever the rule", () => {
  for (const rule of ["din6935", "machinery", "faa", "shop", "k"] as const) {
    const part = build({ ...profile, rule, ...(rule === "k" ? { kFactor: 0.42 } : {}) });
    const deductions = part.bends.reduce((sum, bend) => sum + bend.deduction, 0);
    expect(flatPattern(part).width).toBeCloseTo(180 - deductions, 9);
  }
});

test("the inside radius: the bend's own, the part's, the die's, the material's, and it says which", () => {
  const die = (id: string) => (id === "b1" ? { radius: mm(2.6), source: "die V16" } : null);
  const own: PartDocument = { ...profile, profile: { width: 100, legs: [40, 100, 40], bends: [{ ...up, insideRadius: 3 }, up] } };
  const said = (document: PartDocument) => build(document, die).bends.map((bend) => [bend.insideRadius, bend.radiusSource]);
  expect(said(profile)).toEqual([[2.6, "die V16"], [2, "default of S235: 1 x thickness"]]);
  expect(said({ ...profile, insideRadius: 2 })).toEqual([[2, "document"], [2, "document"]]);
  expect(said(own)).toEqual([[3, "document"], [2, "default of S235: 1 x thickness"]]);
});

test("faces and bends have one order, parents first, and the zone lies between its faces", () => {
  const part = build(tray([
    { id: "back", on: "front", edge: 2, length: 12, ...up },
    { id: "front", on: "base", edge: 0, length: 30, ...up },
  ]));
  expect(part.faces.map(({ id }) => id)).toEqual(["base", "front", "back"]);
  part.bends.forEach((bend, i) => {
    expect(bend.child).toBe(i + 1);
    expect(bend.parent).toBeLessThan(bend.child);
    expect(bend.id).toBe(part.faces[bend.child]?.id);
    const [p, c, d, q] = bend.zone;
    expect(Math.hypot(c[0] - p[0], c[1] - p[1])).toBeCloseTo(bend.allowance, 9);
    expect(Math.hypot(q[0] - d[0], q[1] - d[1])).toBeCloseTo(bend.allowance, 9);
    const [dx, dy] = [bend.line[1][0] - bend.line[0][0], bend.line[1][1] - bend.line[0][1]];
    expect(dx * (c[1] - p[1]) - dy * (c[0] - p[0])).toBeLessThan(0);
  });
});

test("a bent edge of the base is drawn outside: the plane part steps back by the setback", () => {
  const part = build(tray([{ id: "front", on: "base", edge: 0, length: 30, ...up }]));
  expect(Math.min(...(part.faces[0]?.outline ?? []).map(([, y]) => y))).toBeCloseTo(3, 9);
  expect(flatPattern(part).depth).toBeCloseTo(120 + 30 - (part.bends[0]?.deduction ?? NaN), 9);
});

test("where two bent edges meet, each flange begins where the other bend ends: a gap of one inside radius when folded", () => {
  const part = build(tray([
    { id: "front", on: "base", edge: 0, length: 30, ...up },
    { id: "right", on: "base", edge: 1, length: 30, ...up },
  ]));
  expect(part.bends.map((bend) => bend.zone[0])).toEqual([[0, 3], [197, 3]].map(([x, y]) => [expect.closeTo(x ?? NaN, 9), expect.closeTo(y ?? NaN, 9)]));
  expect(part.bends[0]?.zone[3][0]).toBeCloseTo(197, 9);
});

test("an inset larger than the neighbour's bend leaves the base's corner standing", () => {
  const part = build(tray([{ id: "tab", on: "base", edge: 0, length: 30, ...up, start: 40, end: 60, relief: { kind: "rectangular", width: 2, depth: 5 } }]));
  const { outline } = flatPattern(part);
  for (const corner of [[0, 0], [38, 0], [38, 5], [40, 5], [140, 5], [142, 5], [142, 0], [200, 0]]) {
    expect(outline.some(([x, y]) => Math.hypot(x - (corner[0] ?? 0), y - (corner[1] ?? 0)) < 1e-6)).toBe(true);
  }
});

test("start and end run counter-clockwise round the parent, on every level", () => {
  const part = build(tray([
    { id: "front", on: "base", edge: 0, length: 30, ...up },
    { id: "lip", on: "front", edge: 2, length: 12, ...up, start: 50, end: 10 },
    { id: "ear", on: "front", edge: 1, length: 12, ...up, start: 8, end: 6 },
  ]));
  const [, lip, ear] = part.bends;
  expect([lip?.line[0][0], lip?.line[1][0]]).toEqual([expect.closeTo(50, 9), expect.closeTo(190, 9)]);
  // Edge 1 is the end side, from the far edge up to the bend.
  expect((ear?.line[0][1] ?? NaN) < (ear?.line[1][1] ?? NaN)).toBe(true);
});

test("a flange with an outline of its own, an arc in it and a hole", () => {
  const part = build(tray([{
    id: "ear", on: "base", edge: 0, outline: [[0, 0], [60, 0], [60, 20, 1], [0, 20]], start: 70, ...up, holes: [{ circle: [30, 25], diameter: 10 }],
  }]));
  const ear = part.faces[1];
  // 20 less the setback of 3, and a half round of radius 30; the chords keep within 0.02 mm.
  expect(flatPattern(part).depth).toBeCloseTo(120 + 50 - (part.bends[0]?.deduction ?? NaN), 1);
  expect(Math.min(...(ear?.outline ?? []).map(([x]) => x))).toBeCloseTo(70, 6);
  expect(ear?.holes).toHaveLength(1);
});

test("the tray of the folder's README", () => {
  const part = build(tray([
    { id: "front", on: "base", edge: 0, length: 30, ...up },
    { id: "return", on: "front", edge: 2, length: 12, ...up },
  ]));
  const { depth, area, massKg } = flatPattern(part);
  expect([depth, area, massKg].map((value) => Number(value.toFixed(4)))).toEqual([156.2439, 31248.7831, 0.368]);
  expect(part.bends.map(({ allowance, deduction, k }) => [allowance, deduction, k].map((value) => Number(value.toFixed(3))))).toEqual([[3.122, 2.878, 0.325], [3.122, 2.878, 0.325]]);
});

test("mass: 100 x 172.325 x 2 of steel", () => {
  expect(flatPattern(build({ ...profile, insideRadius: 2 })).massKg).toBeCloseTo(0.1 * 0.172325 * 0.002 * 7850, 5);
});

test("flats that overlap are found and shown when they are asked for: both flanges of a re-entrant corner want the same square", () => {
  const document: PartDocument = {
    format: "part/1", name: "L", units: "mm", material: "S235", thickness: 1.5, insideRadius: 1.5, kFactor: 0.5,
    base: { outline: [[0, 0], [200, 0], [200, 60], [100, 60], [100, 120], [0, 120]] },
    flanges: [{ id: "a", on: "base", edge: 2, length: 30, ...up }, { id: "b", on: "base", edge: 3, length: 30, ...up }],
  };
  expect(buildPart(document, { materials: materialById }).ok).toBe(false);
  const built = buildPart(document, { materials: materialById, keepOverlaps: true });
  const overlaps = built.ok ? flatOverlaps(built.value) : [];
  expect(overlaps.map(({ faces }) => faces)).toEqual([[1, 2]]);
  // From the drawn corner: 30 - 3 plane, and the allowance of pi / 2 x 2.25 less the setback of 3.
  const side = 27 + (Math.PI / 2) * 2.25 - 3;
  expect(overlaps[0]?.regions.map((region) => signedArea(region))).toEqual([expect.closeTo(side * side, 6)]);
});

test("an offset is two bends that know one another, named after the flange", () => {
  const part = build(tray([
    { id: "front", on: "base", edge: 0, length: 30, angle: 60, direction: "up", offset: { height: 6 } },
    { id: "lip", on: "front", edge: 2, length: 12, ...up },
  ]));
  expect(part.bends.map(({ id, direction, strokeWith }) => [id, direction, strokeWith])).toEqual([["front-step", "up", 1], ["front", "down", 0], ["lip", "up", null]]);
  expect(reroot(part, 2).bends.map(({ id, strokeWith }) => [id, strokeWith])).toEqual([["front", 2], ["lip", null], ["front-step", 0]]);
});

test("a teardrop's loop turns on until the end of its leg rests on the sheet", () => {
  const part = build({ ...profile, thickness: 1, profile: { width: 50, legs: [60, 12], bends: [{ angle: 180, direction: "up", hem: "teardrop", gap: 4 }] } });
  const [bend] = part.bends;
  const far = part.faces[1]?.outline.map(([x]) => x) ?? [];
  const tip = foldPoint(part, 1, [bend?.angle ?? 0], [Math.max(...far), 25, 1]);
  // The inside edge of the tip comes down to the sheet's top, 1 high.
  expect(tip[2]).toBeCloseTo(1, 9);
  expect(bend?.insideRadius).toBe(2);
});
