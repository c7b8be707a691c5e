import { describe, expect, test } from "vitest";
import { materialById } from "../handbook/materials";
import { buildPart } from "./buildPart";
import { flatPattern } from "./flatPattern";
import { foldPoint } from "./foldPoint";
import type { FlatShape, PartDocument } from "./partDocument";

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
    ["a corner in the bend", { outline: [[0, 0], [120, 0], [120, 39], [100, 39], [100, 80], [0, 80]], bends: [{ id: "a", line: [[0, 40], [100, 40]], ...up }] }, "flat.bends[0].line: the outline has a corner within the bend, which reaches 2.081 mm to each side of the line; move the corner or the line"],
    ["a hole over the edge", { outline: sheet, holes: [{ circle: [20, 78], diameter: 10 }], bends: [{ id: "a", line: [[20, 0], [20, 80]], ...up }] }, "flat.holes[0]: the hole reaches over the edge of the sheet; move it inwards or make it smaller"],
    ["a name twice", { outline: sheet, bends: [{ id: "a", line: [[20, 0], [20, 80]], ...up }, { id: "a", line: [[60, 0], [60, 80]], ...up }] }, 'flat.bends[1].id: "a" is already the name of flat.bends[0]; each bend needs a name of its own'],
  ])("%s", (_, flat, expected) => {
    expect(said(flat)).toContain(expected);
  });
});
