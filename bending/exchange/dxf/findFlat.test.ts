import { describe, expect, test } from "vitest";
import { arc, circle, found, lightPolyline, line, opened, rectangle } from "./fixtures/dxfText";

const kinds = (repairs: readonly { readonly kind: string }[]) => repairs.map(({ kind }) => kind).sort();

describe("what is mended, and listed with its place", () => {
  test("gaps up to the tolerance are closed where the lines would meet", () => {
    const flat = found({ entities: [line(0, 0, 99.96, 0), line(100, 0.04, 100, 60), line(100, 60, 0.05, 60), line(0, 60, 0, 0.03)] });
    expect(flat.outline?.area).toBeCloseTo(6000, 9);
    expect(kinds(flat.repairs)).toEqual(["gap", "gap", "gap"]);
    expect(flat.repairs.map(({ at }) => at.map((value) => Math.round(value)).join(" ")).sort()).toEqual(["0 0", "0 60", "100 0"]);
    expect(flat.repairs[0]?.message).toMatch(/a gap of 0\.0\d\d mm at/);
  });

  test("a gap beyond the tolerance stays open and is named", () => {
    const entities = [line(0, 0, 99.5, 0), ...rectangle(0, 0, 100, 60).slice(1)];
    const flat = found({ entities });
    expect(flat.outline).toBeNull();
    expect(flat.leftovers[0]?.what).toContain("is on no closed contour");
    expect(found({ entities }, { gap: 1 }).outline?.area).toBeCloseTo(6000, 9);
  });

  test("lines drawn twice, either way round, and contours drawn twice", () => {
    const flat = found({ entities: [...rectangle(0, 0, 100, 60), line(100, 0, 0, 0), line(0, 0, 100, 0), circle(50, 30, 5), circle(50, 30, 5)] });
    expect(flat.outline?.area).toBeCloseTo(6000, 9);
    expect(flat.holes).toHaveLength(1);
    expect(kinds(flat.repairs)).toEqual(["drawn twice", "drawn twice", "drawn twice"]);
  });

  test("lines that run over one another become one", () => {
    const flat = found({ entities: [line(0, 0, 70, 0), line(40, 0, 100, 0), line(10, 0, 20, 0), ...rectangle(0, 0, 100, 60).slice(1)] });
    expect(flat.outline?.vertices).toHaveLength(4);
    expect(flat.outline?.area).toBeCloseTo(6000, 9);
    expect(kinds(flat.repairs)).toEqual(["overlap", "overlap"]);
  });

  test("lines without length are taken out", () => {
    const flat = found({ entities: [...rectangle(0, 0, 100, 60), line(7, 7, 7, 7)] });
    expect([flat.outline?.area, kinds(flat.repairs), flat.leftovers]).toEqual([6000, ["no length"], []]);
  });

  test("small crossings at a corner are cut back to it", () => {
    const flat = found({ entities: [line(-0.03, 0, 100, 0), line(100, 0, 100, 60), line(100, 60, 0, 60), line(0, 60, 0, -0.04)] });
    expect(flat.outline?.area).toBeCloseTo(6000, 9);
    expect(kinds(flat.repairs)).toEqual(["crossing"]);
  });

  test("a line that stops just off the middle of another is led to it", () => {
    const flat = found({ entities: [line(0, 0, 100, 0), line(100, 0, 100, 60), line(100, 60, 0, 60), line(20, 60.05, 20, -0.05), line(0, 60, 0, 0)] }, {});
    // The line across is no part of the contour and is offered as a bend.
    expect(flat.outline?.area).toBeCloseTo(6000, 9);
    expect(flat.singleLines).toHaveLength(1);
  });

  test("points in the middle of straight runs are left out", () => {
    expect(found({ entities: [line(0, 0, 50, 0), line(50, 0, 100, 0), ...rectangle(0, 0, 100, 60).slice(1)] }).outline?.vertices).toHaveLength(4);
  });
});

test("a curve drawn as many very short lines keeps its shape", () => {
  const n = 4000;
  const points = Array.from({ length: n }, (_, i) => [1000 * Math.cos((2 * Math.PI * i) / n), 1000 * Math.sin((2 * Math.PI * i) / n)] as const);
  const sheet = found({ entities: points.map(([x, y], i) => { const [u, v] = points[(i + 1) % n] ?? [x, y]; return line(x, y, u, v); }) });
  expect(sheet.outline?.area).toBeCloseTo((n / 2) * 1e6 * Math.sin((2 * Math.PI) / n), 0);
  const fine = found({ entities: [lightPolyline([...Array.from({ length: 30_000 }, (_, i) => [500 * Math.cos((Math.PI * i) / 30_000), 500 * Math.sin((Math.PI * i) / 30_000)] as const), [-500, 0] as const])] });
  expect((fine.outline?.area ?? 0) / (Math.PI * 125_000)).toBeCloseTo(1, 5);
});

describe("what is contour, hole, bend line or neither", () => {
  test("the largest contour is the sheet; contours in holes and outside are left over and named", () => {
    const flat = found({ entities: [...rectangle(0, 0, 100, 60), circle(50, 30, 10), circle(50, 30, 5), circle(200, 30, 5)] });
    expect(flat.holes).toHaveLength(1);
    expect(flat.leftovers.map(({ what }) => what)).toEqual([expect.stringContaining("inside a hole"), expect.stringContaining("outside the sheet")]);
  });

  test("another contour can be chosen, for a frame drawn round the part", () => {
    const fixture = { entities: [...rectangle(-20, -20, 400, 300), ...rectangle(0, 0, 100, 60), circle(50, 30, 10)] };
    expect(found(fixture).outline?.area).toBe(120000);
    const inner = found(fixture, { contour: 1 });
    expect([inner.outline?.area, inner.holes.length]).toEqual([6000, 1]);
  });

  test("bend lines by layer name in several languages, their way too", () => {
    const names = ["Bending", "BEND_DOWN", "Biegelinien oben", "KANTEN-UNTEN", "lignes de pli", "piega su", "plegado abajo", "buiglijn", "Bockning", "ohyb", "bend-up", "Bend-"];
    const drawing = opened({ layers: names.map((name) => ({ name })), entities: [...rectangle(0, 0, 100, 60), ...names.map((name, i) => line(5 + i * 9, 0, 5 + i * 9, 60, name))] });
    const roles = drawing.groups.map(({ key }) => drawing.roles.get(key));
    expect(roles).toEqual(["cut", "bend up", "bend down", "bend up", "bend down", "bend up", "bend up", "bend down", "bend up", "bend up", "bend up", "bend up", "bend down"]);
  });

  test("names that hold such a word by chance are cut; frames, texts and hidden layers are left out", () => {
    const names = ["Outer Profile", "Cutting", "Laser", "replica", "Title Frame", "DIM", "ETCH"];
    const drawing = opened({ layers: [...names.map((name) => ({ name })), { name: "Off", colour: -3 }, { name: "Frozen", flags: 1 }], entities: [...names, "Off", "Frozen"].map((name) => line(0, 0, 1, 1, name)) });
    expect(drawing.groups.map(({ key }) => drawing.roles.get(key))).toEqual(["cut", "cut", "cut", "cut", "leave out", "leave out", "leave out", "leave out", "leave out"]);
  });

  test("without such a layer, dashed straight lines are taken for bend lines", () => {
    const flat = found({ layers: [{ name: "1", lineType: "DASHED" }], entities: [...rectangle(0, 0, 100, 60), line(30, 0, 30, 60, "1")] });
    expect(flat.bends).toHaveLength(1);
  });

  test("lines across the sheet on the contour's own layer are offered, whether they end at corners or on edges", () => {
    const across = [line(30, 0, 30, 60), line(70, 0.5, 70, 59.5)];
    const fixture = { entities: [lightPolyline([[0, 0], [100, 0], [100, 60], [0, 60]]), ...across] };
    expect(found(fixture).singleLines).toHaveLength(2);
    expect(found(fixture, { singleLines: "down" }).bends.map(({ direction }) => direction)).toEqual(["down", "down"]);
    const drawnApart = { entities: [line(0, 0, 30, 0), line(30, 0, 100, 0), line(100, 0, 100, 60), line(100, 60, 30, 60), line(30, 60, 0, 60), line(0, 60, 0, 0), ...across] };
    const flat = found(drawnApart, { singleLines: "up" });
    expect([flat.outline?.area, flat.bends.length]).toEqual([6000, 2]);
  });

  test("dashes of one line and a line broken at a hole are joined; a line broken at a notch is not", () => {
    const layers = [{ name: "bend" }];
    const dashes = Array.from({ length: 6 }, (_, i) => line(30, i * 10 + 1, 30, i * 10 + 8, "bend"));
    const joined = found({ layers, entities: [...rectangle(0, 0, 100, 60), ...dashes, line(70, 0, 70, 25, "bend"), circle(70, 30, 5), line(70, 35, 70, 60, "bend")] });
    expect(joined.bends.map(({ line: [p, q] }) => [p[0], Math.abs(q[1] - p[1])])).toEqual([[30, 57], [70, 60]]);
    const notched = found({ layers, entities: [lightPolyline([[0, 0], [100, 0], [100, 60], [60, 60], [60, 40], [40, 40], [40, 60], [0, 60]]), line(0, 50, 40, 50, "bend"), line(60, 50, 100, 50, "bend")] });
    expect(notched.bends).toHaveLength(2);
  });

  test("a curve on a bend layer, and a bend line beside the sheet, are left over", () => {
    const flat = found({ layers: [{ name: "bend" }], entities: [...rectangle(0, 0, 100, 60), [...arc(50, 30, 5, 0, 90).map((tag) => (tag[0] === 8 ? ([8, "bend"] as const) : tag))], line(150, 0, 150, 60, "bend")] });
    expect(flat.bends).toEqual([]);
    expect(flat.leftovers.map(({ what }) => what)).toEqual([expect.stringContaining("not straight"), expect.stringContaining("outside the sheet")]);
  });
});
