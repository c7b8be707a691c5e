import { describe, expect, test } from "vitest";
import { materialById } from "../handbook/materials";
import { applyFrame } from "../geometry/applyFrame";
import { signedArea } from "../geometry/signedArea";
import { mm } from "../core/units";
import { buildPart } from "../part/buildPart";
import { foldFrames } from "../part/foldFrames";
import type { PartModel } from "../part/partModel";
import { readPartDocument } from "../part/readPartDocument";
import { readHitId, hitId } from "./hitId";
import { inRow } from "./inRow";
import { splitBends } from "./splitBends";
import { widened } from "./widened";

function built(json: unknown): PartModel {
  const read = readPartDocument(json);
  if (!read.ok) throw new Error(JSON.stringify(read.error));
  const part = buildPart(read.value, { materials: materialById });
  if (!part.ok) throw new Error(JSON.stringify(part.error));
  return part.value;
}

const tray = built({
  format: "part/1", name: "Guard", units: "mm", material: "S235", thickness: 2,
  base: { outline: [[0, 0], [300, 0], [300, 200], [0, 200]] },
  flanges: [
    { id: "rim", on: "base", edge: 0, length: 120, angle: 90, direction: "up", insideRadius: 60, start: 40, end: 40 },
    { id: "lip", on: "rim", edge: 2, length: 20, angle: 90, direction: "down", insideRadius: 2 },
    { id: "side", on: "base", edge: 2, length: 20, angle: 90, direction: "up", insideRadius: 2 },
  ],
});

const area = (part: PartModel) => part.faces.reduce((sum, { outline }) => sum + signedArea(outline), 0)
  + part.bends.reduce((sum, { zone }) => sum + Math.abs(signedArea(zone)), 0);

describe("a bend made by several strokes", () => {
  for (const hits of [2, 5, 12]) {
    const { part, rows, bitsOf } = splitBends(tray, [{ bend: "rim", hits, allowance: mm(0.6) }]);

    test(`${hits} strokes turn as far, cover the same sheet and leave the rest of the part alone`, () => {
      expect(part.bends).toHaveLength(tray.bends.length - 1 + hits);
      expect(part.faces).toHaveLength(part.bends.length + 1);
      expect(area(part)).toBeCloseTo(area(tray), 6);
      const row = part.bends.filter(({ id }) => readHitId(id)?.bend === "rim");
      expect(row.reduce((sum, { angle }) => sum + angle, 0)).toBeCloseTo(Math.PI / 2, 12);
      part.bends.forEach((bend, index) => {
        expect(bend.child).toBe(index + 1);
        expect(bend.parent).toBeLessThan(bend.child);
        expect(part.faces[bend.child]?.bend).toBe(index);
      });
      expect(part.bends.map(({ id }) => id).filter((id) => readHitId(id) === null)).toEqual(["lip", "side"]);
      expect(rows.filter((bits) => bits !== 0)).toHaveLength(hits);
      expect(bitsOf.reduce((all, bits) => all | bits, 0)).toBe(2 ** part.bends.length - 1);
    });

    test(`${hits} strokes end where the arc ends, nearer with every stroke more`, () => {
      const end = (of: PartModel) => {
        const face = of.faces.findIndex(({ id }) => id === "lip");
        const frames = foldFrames(of, of.bends.map(({ angle }) => angle));
        const corner = of.faces[face]?.outline[0] ?? [0, 0];
        return applyFrame(frames[face] as (typeof frames)[number], [corner[0], corner[1], 0]);
      };
      const [made, drawn] = [end(part), end(tray)];
      // A polygon round an arc of R with n sides is longer by R angle^3 / (12 n^2) to first order: from the series of 2 n tan(angle / 2n).
      const off = (62 * (Math.PI / 2) ** 3) / (12 * hits ** 2);
      expect(Math.hypot(...made.map((value, i) => value - (drawn[i] ?? 0)))).toBeLessThan(1.2 * off + 1e-6);
    });
  }

  test("what has no split stays as it is", () => {
    expect(splitBends(tray, []).part).toEqual(tray);
    expect(splitBends(tray, [{ bend: "rim", hits: 1, allowance: mm(0.6) }]).part).toEqual(tray);
  });
});

describe("a row of strokes", () => {
  const rows = [0, 0b1110, 0b1110, 0b1110];
  const allowed = (formed: number) => [0, 1, 2, 3].filter((bend) => !(formed & (1 << bend)) && inRow(rows, [bend], formed));

  test("is made from one end to the other without a gap", () => {
    expect(allowed(0)).toEqual([0, 1, 3]);
    expect(allowed(0b0010)).toEqual([0, 2]);
    expect(allowed(0b1000)).toEqual([0, 2]);
    expect(allowed(0b1100)).toEqual([0, 1]);
    expect(allowed(0b0111)).toEqual([3]);
  });

  test("is known by its names", () => {
    expect(readHitId(hitId("rim hit", 3, 9))).toEqual({ bend: "rim hit", number: 3, of: 9 });
    expect(readHitId("rim")).toBeNull();
  });
});

test("an outline is carried on over an edge, whole or in part, and refused where no edge runs so", () => {
  const square = [[0, 0], [10, 0], [10, 10], [0, 10]] as const;
  expect(widened(square, [0, 0], [10, 0], [0, -2], [10, -2])).toEqual([[0, 0], [0, -2], [10, -2], [10, 0], [10, 10], [0, 10]]);
  expect(signedArea(widened(square, [2, 0], [8, 0], [2, -1], [8, -1]) ?? [])).toBeCloseTo(106, 9);
  expect(widened(square, [0, 1], [10, 1], [0, 0], [10, 0])).toBeNull();
  expect(widened(square, [10, 0], [0, 0], [10, -2], [0, -2])).toBeNull();
});
