import * as polyclip from "polyclip-ts";
import { describe, expect, test } from "vitest";
import { materialById } from "../../handbook/materials";
import { buildPart } from "../buildPart";
import { signedArea } from "../../geometry/signedArea";
import { flatPattern } from "../flatPattern";
import { foldPoint } from "../foldPoint";
import type { FlatShape, PartDocument } from "../partDocument";

const head = { format: "part/1", name: "Cover", units: "mm", material: "S235", thickness: 2, insideRadius: 2 } as const;
const up = { angle: 90, direction: "up" } as const;
const build = (flat: FlatShape, more: object = {}) => buildPart({ ...head, ...more, flat } as PartDocument, { materials: materialById });
function must(flat: FlatShape, more: object = {}) {
  const built = build(flat, more);
  if (!built.ok) throw new Error(JSON.stringify(built.error));
  return built.value;
}

/** U 40/100/40, r = s = 2 by DIN 6935: flat 172.325; each line 40 less half the deduction of 3.837 from its end. */
const channelFlat = 172.32522;
const bendAt = 40 - 3.83739 / 2;
const channel: FlatShape = {
  outline: [[0, 0], [channelFlat, 0], [channelFlat, 100], [0, 100]],
  holes: [{ circle: [86, 50], diameter: 20 }, { circle: [15, 20], diameter: 6 }],
  bends: [
    { id: "left", line: [[bendAt, 0], [bendAt, 100]], ...up },
    { id: "right", line: [[channelFlat - bendAt, 100], [channelFlat - bendAt, 0]], ...up },
  ],
};

test("the flat is kept, and folds into the part that it was unfolded from", () => {
  const part = must(channel);
  const pattern = flatPattern(part);
  expect(pattern.width).toBeCloseTo(channelFlat, 9);
  expect(pattern.area).toBeCloseTo(channelFlat * 100 - Math.PI * (100 + 9), 6);
  expect(part.faces.map(({ id, holes }) => [id, holes.length])).toEqual([["base", 1], ["left", 1], ["right", 0]]);
  const corners = part.faces.flatMap((face, i) => face.outline.flatMap(([x, y]) => [0, 2].map((z) => foldPoint(part, i, part.bends.map((bend) => bend.angle), [x, y, z]))));
  const size = ([0, 1, 2] as const).map((axis) => Math.max(...corners.map((p) => p[axis])) - Math.min(...corners.map((p) => p[axis])));
  [100, 100, 40].forEach((value, axis) => expect(size[axis]).toBeCloseTo(value, 3));
});

test("the sense in which a line is drawn does not matter", () => {
  const turned: FlatShape = { ...channel, bends: channel.bends.map((bend) => ({ ...bend, line: [bend.line[1], bend.line[0]] as const })) };
  expect(must(turned)).toEqual(must(channel));
});

test("a rounded end, a slanted end and a chain of bends", () => {
  const rounded = must({ outline: [[0, 0], [120, 0], [120, 80, 0.4142], [0, 80]], bends: [{ id: "b1", line: [[20, 0], [20, 80]], ...up, insideRadius: 1 }] }, { material: "1.4301", thickness: 1 });
  expect(rounded.faces).toHaveLength(2);
  const slanted = must({ outline: [[0, 0], [120, 0], [110, 80], [0, 80]], bends: [{ id: "b1", line: [[0, 40], [115, 40]], ...up }] });
  expect(flatPattern(slanted).area).toBeCloseTo(9200, 6);
  const chain = must({ outline: [[0, 0], [200, 0], [200, 50], [0, 50]], bends: [{ id: "far", line: [[170, 0], [170, 50]], ...up }, { id: "near", line: [[130, 0], [130, 50]], ...up }] });
  expect(chain.faces.map(({ id }) => id)).toEqual(["base", "near", "far"]);
  expect(chain.bends.map(({ parent, child }) => [parent, child])).toEqual([[0, 1], [1, 2]]);
});

/** An outline with a round notch cut where each of the points is a corner of it. */
function outlineLessCircles(outline: readonly (readonly [number, number])[], at: readonly (readonly [number, number])[], radius: number): readonly (readonly [number, number])[] {
  const circle = ([x, y]: readonly [number, number]): [number, number][] => Array.from({ length: 24 }, (_, i) => [x + radius * Math.cos((i * Math.PI) / 12), y + radius * Math.sin((i * Math.PI) / 12)]);
  const [only] = polyclip.difference([outline.map(([x, y]): [number, number] => [x, y])], ...at.map((p) => [circle(p)]));
  return (only?.[0] ?? []).slice(0, -1).map(([x, y]) => [x, y] as const);
}

describe("real flats", () => {
  const sheet = [[0, 0], [120, 0], [120, 80], [0, 80]] as const;
  const shape = (flat: FlatShape) => {
    const part = must(flat);
    const faces = part.faces.reduce((sum, { outline, holes }) => sum + signedArea(outline) - holes.reduce((taken, hole) => taken + Math.abs(signedArea(hole)), 0), 0);
    const zones = part.bends.reduce((sum, { zone, region }) => sum + (region === null ? signedArea(zone) : region.reduce((all, one) => all + signedArea(one.outline) + one.holes.reduce((taken, hole) => taken + signedArea(hole), 0), 0)), 0);
    return { part, ids: part.faces.map(({ id }) => id), faces, zones, pieces: faces + zones, area: flatPattern(part).area };
  };
  const half = ((Math.PI / 2) * (2 + 0.325 * 2)) / 2;

  test("a corner within the bend: the zone ends square at it", () => {
    const { part, pieces, area } = shape({ outline: [[0, 0], [120, 0], [120, 39], [100, 39], [100, 80], [0, 80]], bends: [{ id: "a", line: [[0, 40], [100, 40]], ...up }] });
    expect(area).toBeCloseTo(100 * 80 + 20 * 39, 9);
    expect(pieces).toBeCloseTo(area, 6);
    expect(part.bends[0]?.zone.map(([x]) => x).sort((a, b) => a - b)).toEqual([0, 0, 100, 100]);
  });

  test("a line between two notches that are cut deeper than the bend", () => {
    const outline = [[0, 0], [120, 0], [120, 80], [90, 80], [90, 55], [88, 55], [88, 80], [32, 80], [32, 55], [30, 55], [30, 80], [0, 80]] as const;
    const { part, ids, pieces, area } = shape({ outline, bends: [{ id: "tab", line: [[33, 60], [87, 60]], ...up }] });
    expect(ids).toEqual(["base", "tab"]);
    expect(signedArea(part.faces[1]?.outline ?? [])).toBeCloseTo(56 * (20 - half), 6);
    expect(pieces).toBeCloseTo(area, 6);
  });

  test("several tabs under one line, each a bend of its own, and two lines on one line that bend one flange", () => {
    const tabs = shape({ outline: [[0, 0], [120, 0], [120, 80], [70, 80], [70, 50], [50, 50], [50, 80], [0, 80]], bends: [{ id: "tab", line: [[0, 60], [120, 60]], ...up }] });
    expect(tabs.ids).toEqual(["base", "tab", "tab-2"]);
    expect(tabs.pieces).toBeCloseTo(tabs.area, 6);
    const window = { polygon: [[50, 55], [70, 55], [70, 65], [50, 65]] } as const;
    for (const lines of [[[[0, 60], [50, 60]], [[70, 60], [120, 60]]], [[[0, 60], [50, 60]], [[120, 60], [70, 60]]]] as const) {
      const two = shape({ outline: sheet, holes: [window], bends: lines.map((line, i) => ({ id: `b${i}`, line, ...up })) });
      expect(two.ids).toEqual(["base", "b0"]);
      expect(two.part.bends[0]?.region).toHaveLength(2);
      expect(two.zones).toBeCloseTo(100 * 2 * half, 6);
      expect(two.pieces).toBeCloseTo(two.area, 6);
    }
  });

  test("a tab cut free within the sheet by a slot on three sides", () => {
    const slot = { polygon: [[40, 20], [42, 20], [42, 60], [78, 60], [78, 20], [80, 20], [80, 62], [40, 62]] } as const;
    const { part, ids, pieces, area } = shape({ outline: sheet, holes: [slot], bends: [{ id: "louvre", line: [[42, 25], [78, 25]], ...up }] });
    expect(ids).toEqual(["base", "louvre"]);
    expect(signedArea(part.faces[1]?.outline ?? [])).toBeCloseTo(36 * (35 - half), 6);
    expect(area).toBeCloseTo(120 * 80 - (40 * 42 - 36 * 40), 9);
    expect(pieces).toBeCloseTo(area, 6);
  });

  test("a hole across a bend is kept in the flat and named with what it touches", () => {
    const { part, area } = shape({ outline: sheet, holes: [{ circle: [20, 40], diameter: 10 }], bends: [{ id: "a", line: [[20, 0], [20, 80]], ...up }] });
    expect(part.holesAcross.map(({ path, bends, faces }) => [path, bends, faces])).toEqual([["flat.holes[0]", [0], [0, 1]]]);
    expect(area).toBeCloseTo(120 * 80 - 25 * Math.PI, 9);
  });

  test("four flanges whose bend lines meet in round holes, one of its bend lines slanted", () => {
    const holes = [[20, 20], [100, 20], [104, 60], [20, 60]].map(([x, y]) => ({ circle: [x ?? 0, y ?? 0] as const, diameter: 8 }));
    const outline = [[20, 0], [100, 0], [100, 20], [120, 20], [120, 60], [104, 60], [104, 80], [20, 80], [20, 60], [0, 60], [0, 20], [20, 20]] as const;
    const corners = holes.map(({ circle: [x, y] }) => [x, y] as const);
    const notched = outlineLessCircles(outline, corners, 4);
    const { part, ids, pieces, area } = shape({
      outline: notched,
      bends: [
        { id: "s", line: [[24, 20], [96, 20]], ...up }, { id: "e", line: [[100.4, 24], [103.6, 56]], ...up },
        { id: "n", line: [[100, 60], [24, 60]], ...up }, { id: "w", line: [[20, 24], [20, 56]], ...up },
      ],
    });
    expect(ids).toEqual(["base", "s", "e", "n", "w"]);
    expect(pieces).toBeCloseTo(area, 6);
    expect(part.bends.every(({ region }) => region !== null)).toBe(true);
  });

  test("corner notches a little too small for the bends: both bends end where their borders meet", () => {
    const flat = (corner: number): FlatShape => ({
      outline: [[0, 0], [100 + corner, 0], [100 + corner, 20 - corner], [120, 20 - corner], [120, 80], [0, 80]],
      bends: [{ id: "s", line: [[0, 20 - half], [100, 20 - half]], ...up }, { id: "e", line: [[100 + half, 20], [100 + half, 80]], ...up }],
    });
    const { part, ids, pieces, area } = shape(flat(1));
    expect(ids).toEqual(["base", "s", "e"]);
    // What is left over is the bit between the ends: no larger than the square that the borders make past their meeting.
    expect(area - pieces).toBeGreaterThan(0);
    expect(area - pieces).toBeLessThan(1 + 2 * half);
    expect(part.bends.every(({ zone }) => signedArea(zone) > 0)).toBe(true);
  });

  test("the base is where the document says, else the largest face", () => {
    const bends = [{ id: "a", line: [[20, 0], [20, 80]] as const, ...up }];
    expect(signedArea(must({ outline: sheet, bends }).faces[0]?.outline ?? [])).toBeGreaterThan(5000);
    expect(signedArea(must({ outline: sheet, bends, base: [5, 5] }).faces[0]?.outline ?? [])).toBeLessThan(2000);
  });
});

describe("what cannot be folded is said", () => {
  const sheet = [[0, 0], [120, 0], [120, 80], [0, 80]] as const;
  const said = (flat: FlatShape) => {
    const built = build(flat);
    return built.ok ? [] : built.error.map(({ path, message }) => `${path}: ${message}`);
  };
  test.each<[string, FlatShape, string]>([
    ["a line that ends in the sheet", { outline: sheet, bends: [{ id: "a", line: [[20, 0], [20, 40]], ...up }] }, "flat.bends[0].line: the bend line must run from edge to edge: it is 40 mm long, the sheet along it 80 mm"],
    ["a line off the sheet", { outline: sheet, bends: [{ id: "a", line: [[150, 0], [150, 80]], ...up }] }, "flat.bends[0].line: the bend line must lie on the sheet"],
    ["a line along the edge", { outline: sheet, bends: [{ id: "a", line: [[1, 0], [1, 80]], ...up }] }, "flat.bends[0].line: the bend line is too near the edge: the bend takes 2.081 mm on each side of it"],
    ["lines that cross", { outline: sheet, bends: [{ id: "a", line: [[20, 0], [20, 80]], ...up }, { id: "b", line: [[0, 20], [120, 20]], ...up }] }, 'flat.bends[1].line: the bends "b" and "a" run into one another; move their lines further apart or cut the corner out'],
    ["a hole over the edge", { outline: sheet, holes: [{ circle: [20, 78], diameter: 10 }], bends: [{ id: "a", line: [[20, 0], [20, 80]], ...up }] }, "flat.holes[0]: the hole reaches over the edge of the sheet; move it inwards or make it smaller"],
    ["a name twice", { outline: sheet, bends: [{ id: "a", line: [[20, 0], [20, 80]], ...up }, { id: "a", line: [[60, 0], [60, 80]], ...up }] }, 'flat.bends[1].id: "a" is already the name of flat.bends[0]; each bend needs a name of its own'],
  ])("%s", (_, flat, expected) => {
    expect(said(flat)).toContain(expected);
  });
});
