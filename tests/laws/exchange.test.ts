import DxfParser from "dxf-parser";
import { Helper } from "dxf";
import fc from "fast-check";
import { describe, expect, test, vi } from "vitest";
import { buildPart, flatPattern, materialById, type PartDocument, type PartModel } from "@/bending";
import { importDxf } from "@/bending/exchange/dxf/import/importDxf";
import { writeDxf } from "@/bending/exchange/dxf/write/writeDxf";
import { flatDrawing } from "@/bending/exchange/flatDrawing";
import { arbitraryProfile, arbitraryTray } from "./arbitraryPart";
import { mustBuild } from "./mustBuild";

vi.setConfig({ testTimeout: 300_000 });

// Without a relief a flange that is set in leaves a cut without width, which an outline cannot hold.
const relieved = arbitraryTray.map((document): PartDocument => ({ ...document, relief: { kind: "rectangular" } }));
const anyPart = fc.oneof(arbitraryProfile, relieved);
// Reliefs of flanges set in by a hair can cut a corner off the base.
const builds = (document: PartDocument) => buildPart(document, { materials: materialById }).ok;

const curved: PartDocument = {
  format: "part/1", name: "Ä <bracket>", units: "mm", material: "S235", thickness: 2, insideRadius: 2,
  flat: {
    outline: [[0, 0], [120, 0], [120, 70, 0.41421356], [110, 80], [10, 80, 0.41421356], [0, 70]],
    holes: [{ circle: [100, 20], diameter: 12 }, { slot: [[80, 60], [95, 60]], width: 8 }, { polygon: [[50, 20], [60, 20], [55, 30]] }],
    bends: [{ id: "fold", line: [[30, 0], [30, 80]], angle: 75, direction: "down", insideRadius: 3 }],
  },
};

/** Lower left corner at 0, 0, as an import leaves it. */
function fromCorner(part: PartModel) {
  const { bounds, ...flat } = flatPattern(part);
  const move = ([x, y]: readonly [number, number]) => [x - bounds.min[0], y - bounds.min[1]] as const;
  return { ...flat, lines: flat.bendLines.map(({ line }) => line.map(move)) };
}

/** How far two lines lie apart at their ends, whichever way round they run. */
function apart(a: readonly (readonly number[])[] = [], b: readonly (readonly number[])[] = []): number {
  const between = (p: readonly number[] = [], q: readonly number[] = []) => Math.hypot((p[0] ?? NaN) - (q[0] ?? NaN), (p[1] ?? NaN) - (q[1] ?? NaN));
  return Math.min(Math.max(between(a[0], b[0]), between(a[1], b[1])), Math.max(between(a[0], b[1]), between(a[1], b[0])));
}

function expectSameFlat(document: PartDocument) {
  const part = mustBuild(document);
  const read = importDxf(writeDxf(flatDrawing(part), document.units), { name: part.name, material: document.material, thickness: part.thickness });
  if (!read.ok) throw new Error(read.error);
  expect([read.value.found.repairs, read.value.found.leftovers, read.value.opened.notes]).toEqual([[], [], []]);
  const [before, after] = [fromCorner(part), fromCorner(mustBuild(read.value.document))];
  expect(after.area).toBeCloseTo(before.area, 2);
  expect([after.width, after.depth]).toEqual([expect.closeTo(before.width, 3), expect.closeTo(before.depth, 3)]);
  expect(after.holes).toHaveLength(before.holes.length);
  after.bendLines.forEach((bend) => {
    const i = before.bendLines.findIndex(({ id }) => id === bend.id);
    const drawn = before.bendLines[i];
    expect([bend.direction, bend.angle, bend.insideRadius]).toEqual([drawn?.direction, expect.closeTo(drawn?.angle ?? NaN, 9), expect.closeTo(drawn?.insideRadius ?? NaN, 9)]);
    expect(apart(after.lines[after.bendLines.indexOf(bend)], before.lines[i])).toBeLessThan(2e-3);
  });
}

describe("a part drawn as DXF and read again has the same flat", () => {
  test("any profile and tray", () => fc.assert(fc.property(anyPart, (document) => { fc.pre(builds(document)); expectSameFlat(document); }), { numRuns: 60 }));
  test("arcs, slots and a bend of its own radius", () => expectSameFlat(curved));
  test("in inches", () => expectSameFlat({ ...curved, units: "in", thickness: 0.08, insideRadius: 0.08, flat: { outline: [[0, 0], [5, 0], [5, 3], [0, 3]], bends: [{ id: "b1", line: [[2, 0], [2, 3]], angle: 90, direction: "up" }] } } as PartDocument));
});

test("a cut without width beside a bend comes back as a narrow one, and the part folds as before", () => {
  const part = mustBuild({
    format: "part/1", name: "tab", units: "mm", material: "S235", thickness: 1, insideRadius: 1,
    base: { outline: [[0, 0], [120, 0], [120, 80], [0, 80]] }, flanges: [{ id: "tab", on: "base", edge: 0, length: 25, angle: 90, direction: "up", start: 30, end: 40 }],
  });
  const read = importDxf(writeDxf(flatDrawing(part), "mm"), { name: "back", material: "S235", thickness: 1 });
  if (!read.ok) throw new Error(read.error);
  expect(read.value.found.repairs.map(({ kind }) => kind)).toEqual(["slit", "slit"]);
  const back = mustBuild(read.value.document);
  expect(back.faces.map(({ id }) => id)).toEqual(["base", "tab"]);
  expect(flatPattern(part).area - flatPattern(back).area).toBeGreaterThan(0.1);
  expect(flatPattern(part).area - flatPattern(back).area).toBeLessThan(3);
});

/** Area of a closed polyline of [x, y, bulge] by the trapezoids and circular segments. */
function areaOf(vertices: readonly { readonly x: number; readonly y: number; readonly bulge?: number | undefined }[]): number {
  return Math.abs(vertices.reduce((sum, p, i) => {
    const q = vertices[(i + 1) % vertices.length] ?? p;
    const angle = 4 * Math.atan(p.bulge ?? 0);
    const radius = angle === 0 ? 0 : Math.hypot(q.x - p.x, q.y - p.y) / (2 * Math.sin(angle / 2));
    return sum + (p.x * q.y - q.x * p.y) / 2 + (radius * radius * (angle - Math.sin(angle))) / 2;
  }, 0));
}

describe("two other readers see the same drawing", () => {
  const readers: readonly (readonly [string, (text: string) => { readonly polylines: readonly (readonly [boolean, number])[]; readonly circles: readonly number[]; readonly lines: ReadonlyMap<string, number>; readonly units: unknown }])[] = [
    ["one", (text) => {
      const drawing = new DxfParser().parseSync(text);
      if (!drawing) throw new Error("not read");
      const lines = new Map<string, number>();
      for (const entity of drawing.entities) if (entity.type === "LINE") lines.set(entity.layer, (lines.get(entity.layer) ?? 0) + 1);
      return {
        polylines: drawing.entities.flatMap((entity) => (entity.type === "LWPOLYLINE" && "shape" in entity && "vertices" in entity ? [[entity.shape === true, areaOf(entity.vertices as never)] as const] : [])),
        circles: drawing.entities.flatMap((entity) => ("radius" in entity ? [Number(entity.radius)] : [])), lines, units: drawing.header.$INSUNITS,
      };
    }],
    ["another", (text) => {
      const { parsed } = new Helper(text);
      const lines = new Map<string, number>();
      for (const { type, layer } of parsed.entities) if (type === "LINE") lines.set(layer, (lines.get(layer) ?? 0) + 1);
      return {
        polylines: parsed.entities.flatMap((entity) => (entity.type === "LWPOLYLINE" ? [[entity.closed === true, areaOf(entity.vertices ?? [])] as const] : [])),
        circles: parsed.entities.flatMap((entity) => (entity.type === "CIRCLE" ? [entity.r ?? NaN] : [])), lines, units: parsed.header.insUnits,
      };
    }],
  ];
  test.each(readers)("%s", (_, read) => {
    const part = mustBuild(curved);
    const seen = read(writeDxf(flatDrawing(part), "mm", { bendTicks: true, text: "P-1 ä" }));
    const flat = flatPattern(part);
    expect(seen.polylines.every(([closed]) => closed)).toBe(true);
    const [outline = [true, NaN], ...holes] = seen.polylines;
    const area = outline[1] - holes.reduce((sum, [, hole]) => sum + hole, 0) - seen.circles.reduce((sum, radius) => sum + Math.PI * radius * radius, 0);
    expect(area).toBeCloseTo(flat.area, 4);
    expect([...seen.lines].sort()).toEqual([["BEND_DOWN", 1], ["ETCH", 2]]);
    expect(seen.units).toBe(4);
  });
});
