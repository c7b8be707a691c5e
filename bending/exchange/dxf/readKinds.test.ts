import { describe, expect, test } from "vitest";
import { arc, circle, dxfText, found, insert, lightPolyline, line, opened, rectangle } from "./fixtures/dxfText";
import { decodeDxf } from "./read/decodeDxf";
import { openDrawing } from "./import/openDrawing";

describe("every kind of line that a flat is drawn with", () => {
  test("lines and arcs: a rectangle with round corners", () => {
    const flat = found({ entities: [
      line(5, 0, 95, 0), arc(95, 5, 5, 270, 0), line(100, 5, 100, 55), arc(95, 55, 5, 0, 90), line(95, 60, 5, 60), arc(5, 55, 5, 90, 180), line(0, 55, 0, 5), arc(5, 5, 5, 180, 270),
    ] });
    expect(flat.outline?.area).toBeCloseTo(6000 - (4 - Math.PI) * 25, 6);
    expect(flat.outline?.vertices).toHaveLength(8);
    expect([flat.repairs, flat.leftovers]).toEqual([[], []]);
  });

  test("a circle, and an arc of nearly a whole turn, stay round", () => {
    const flat = found({ entities: [...rectangle(0, 0, 100, 60), circle(30, 30, 4), arc(70, 30, 6, 10, 350), line(70 + 6 * Math.cos(Math.PI / 18), 30 + 6 * Math.sin(Math.PI / 18), 70 + 6 * Math.cos(Math.PI / 18), 30 - 6 * Math.sin(Math.PI / 18))] });
    expect(flat.holes.map(({ circle: round }) => round)).toEqual([null, { centre: [30, 30], radius: 4 }]);
    // A circle without the segment of 20 degrees.
    expect(flat.holes[0]?.area).toBeCloseTo(Math.PI * 36 - 18 * (Math.PI / 9 - Math.sin(Math.PI / 9)), 6);
  });

  test("an ellipse becomes arcs within a hundredth of a millimetre", () => {
    const flat = found({ entities: [...rectangle(0, 0, 100, 60), [[0, "ELLIPSE"], [8, "0"], [10, 50], [20, 30], [11, 20], [21, 0], [40, 0.5]]] });
    const [hole] = flat.holes;
    expect(Math.abs((hole?.area ?? 0) - Math.PI * 20 * 10)).toBeLessThan(0.01 * 97);
    for (const [x, y] of hole?.vertices ?? []) expect(((x - 50) / 20) ** 2 + ((y - 30) / 10) ** 2).toBeCloseTo(1, 9);
    expect(hole?.vertices.length).toBeLessThan(40);
  });

  test("a rational spline of degree 2 that is a quarter circle", () => {
    const w = Math.SQRT1_2;
    const flat = found({ entities: [
      line(0, 0, 10, 0), line(0, 10, 0, 0),
      [[0, "SPLINE"], [8, "0"], [70, 4], [71, 2], ...[0, 0, 0, 1, 1, 1].map((knot) => [40, knot] as const), ...[1, w, 1].map((weight) => [41, weight] as const), [10, 10], [20, 0], [10, 10], [20, 10], [10, 0], [20, 10]],
    ] });
    expect(flat.outline?.area).toBeCloseTo(25 * Math.PI, 5);
  });

  test("a spline that is given by fit points only runs through them", () => {
    const flat = found({ entities: [line(0, 0, 30, 0), [[0, "SPLINE"], [8, "0"], [71, 3], [11, 0], [21, 0], [11, 10], [21, 8], [11, 20], [21, 8], [11, 30], [21, 0]]] });
    const corners = flat.outline?.vertices.map(([x, y]) => `${x} ${y}`) ?? [];
    expect(corners).toEqual(expect.arrayContaining(["10 8", "20 8"]));
  });

  test("polylines with bulges, light and old, closed and open", () => {
    const slot: readonly (readonly [number, number, number?])[] = [[20, 20], [40, 20, 1], [40, 30], [20, 30, 1]];
    const old = [[0, "POLYLINE"], [8, "0"], [66, 1], [70, 1]] as const;
    const vertices = slot.flatMap(([x, y, bulge]) => [[0, "VERTEX"], [8, "0"], [10, x + 40], [20, y], ...(bulge ? [[42, bulge] as const] : [])] as const);
    const flat = found({ entities: [lightPolyline([[0, 0], [100, 0], [100, 60], [0, 60], [0, 0]], false), lightPolyline(slot), [...old, ...vertices, [0, "SEQEND"]]] });
    expect(flat.outline?.area).toBeCloseTo(6000, 9);
    expect(flat.holes.map(({ area }) => area)).toEqual([expect.closeTo(200 + 25 * Math.PI, 6), expect.closeTo(200 + 25 * Math.PI, 6)]);
  });

  test("seen from below (extrusion 0, 0, -1) x is turned round, and arcs with it", () => {
    const below = [[210, 0], [220, 0], [230, -1]] as const;
    const flat = found({ entities: [...rectangle(0, 0, 100, 60), [...circle(-20, 30, 4), ...below], [...lightPolyline([[-60, 20], [-80, 20, 1], [-80, 30], [-60, 30, 1]]), ...below]] });
    expect(flat.holes.map(({ area }) => area)).toEqual([expect.closeTo(200 - 25 * Math.PI, 6), expect.closeTo(16 * Math.PI, 6)].sort());
    expect(flat.holes.some(({ circle: round }) => round?.centre[0] === 20)).toBe(true);
  });

  test("blocks within blocks: scaled, turned, mirrored, in rows, with layer, colour and line type of where they are put", () => {
    const fixture = {
      layers: [{ name: "Bends", colour: 4, lineType: "DASHED" }],
      blocks: {
        HOLE: [circle(0, 0, 1)],
        PAIR: [insert("HOLE", 0, 0, [[41, 2], [42, 2]]), insert("HOLE", 10, 0, [[41, 4], [42, 2]])],
        FOLD: [line(0, 0, 0, 60)],
      },
      entities: [
        ...rectangle(0, 0, 100, 60), insert("PAIR", 20, 20, [[50, 90]]), insert("HOLE", 60, 10, [[70, 3], [71, 2], [44, 10], [45, 20]]),
        [[0, "INSERT"], [8, "Bends"], [2, "FOLD"], [10, 50], [20, 0]] as const,
      ],
    };
    const flat = found(fixture);
    expect(flat.holes.filter(({ circle: round }) => round)).toHaveLength(7);
    const ellipse = flat.holes.find(({ circle: round }) => !round);
    expect(ellipse?.area).toBeCloseTo(8 * Math.PI, 1);
    // Turned by 90 degrees its long axis stands up: no farther than 2 from x = 20, 4 from y = 30.
    expect(Math.max(...(ellipse?.vertices.map(([x]) => Math.abs(x - 20)) ?? []))).toBeCloseTo(2, 6);
    expect(Math.max(...(ellipse?.vertices.map(([, y]) => Math.abs(y - 30)) ?? []))).toBeCloseTo(4, 6);
    expect(flat.bends).toEqual([{ line: [[50, 0], [50, 60]], direction: "up", data: null }]);
    expect(opened(fixture).groups.map(({ layer, colour, dashed }) => [layer, colour, dashed])).toEqual([["0", 7, false], ["Bends", 4, true]]);
  });
});

describe("what is wrong is said with its line and what was expected", () => {
  const good = dxfText({ entities: rectangle(0, 0, 100, 60) });
  const at = (text: string, find: string, put: string) => text.replace(find, put);
  test.each([
    ["", "empty"],
    ["hello", "group code"],
    ["1\nx\n", "must begin with group 0, SECTION"],
    [good.slice(0, good.length / 2), "ends in the middle"],
    [good.slice(0, good.lastIndexOf("EOF") - 2), "EOF was expected"],
    [at(good, "\n10\n", "\nten\n"), `line ${good.slice(0, good.indexOf("\n10\n")).split("\n").length + 1}: a group code (a whole number) was expected, but there stands "ten"`],
    [dxfText({ entities: [] }), "no entities"],
    [dxfText({ entities: [insert("A", 0, 0)], blocks: { A: [insert("B", 0, 0)], B: [insert("A", 0, 0)] } }), 'puts itself in: A > B > A'],
    [dxfText({ entities: [insert("A", 0, 0, [[70, 32000], [71, 32000]])], blocks: { A: [circle(0, 0, 1)] } }), "put in 1024000000 times"],
  ])("%#", (text, says) => {
    const read = openDrawing(text);
    expect(read.ok ? "read" : read.error).toContain(says);
  });

  test("an entity that cannot be read is left out and named, the others stay", () => {
    const drawing = opened({ entities: [
      ...rectangle(0, 0, 100, 60), [[0, "CIRCLE"], [8, "0"], [10, "wide"], [20, 1], [40, 1]], [[0, "CIRCLE"], [8, "0"], [10, 1], [20, 1], [40, -1]], [[0, "CIRCLE"], [8, "0"], [10, 1], [20, 1]],
      [[0, "LINE"], [8, "0"], [10, 1e300], [20, 1], [11, 1], [21, 1]], [[0, "SPLINE"], [8, "0"], [71, 3], [40, 0], [10, 1], [20, 1]], [[0, "3DSOLID"], [8, "0"]], insert("NONE", 0, 0),
    ] });
    expect(drawing.shapes).toHaveLength(4);
    const says = drawing.notes.map(({ message }) => message);
    for (const [i, part] of ['centre x (group 10) must be a number, but there stands "wide"', "the radius must be more than 0, not -1", "the radius (group 40) is missing", "beyond 100000000", "needs 4 control points", "this kind is not read", 'the block "NONE" is not in the file'].entries()) {
      expect(says[i]).toContain(part);
    }
  });

  test("binary files are named as what they are, and old text is read", () => {
    const bytes = (text: string) => Uint8Array.from(text, (sign) => sign.charCodeAt(0));
    expect(decodeDxf(bytes("AC1027\0\0"))).toMatchObject({ ok: false, error: expect.stringContaining("binary drawing") });
    expect(decodeDxf(bytes("0\nSECTION\n\0"))).toMatchObject({ ok: false, error: expect.stringContaining("not text") });
    expect(decodeDxf(bytes("K\u00e4nten"))).toEqual({ ok: true, value: "Känten" });
    const drawing = opened({ layers: [{ name: "K\\U+00E4nten" }], entities: [line(0, 0, 1, 0, "K\\U+00E4nten")] });
    expect(drawing.groups[0]?.layer).toBe("Känten");
    const carriage = openDrawing(dxfText({ entities: rectangle(0, 0, 9, 9) }).replaceAll("\n", "\r"));
    expect(carriage.ok).toBe(true);
  });
});
