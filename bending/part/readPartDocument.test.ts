import { describe, expect, test } from "vitest";
import { materialById } from "../handbook/materials";
import { buildPart } from "./buildPart";
import { readPartDocument } from "./readPartDocument";

const square = [[0, 0], [200, 0], [200, 120], [0, 120]];
const head = { format: "part/1", name: "Tray", units: "mm", material: "S235", thickness: 1.5, insideRadius: 1.5 };
const front = { id: "front", on: "base", edge: 0, length: 30, angle: 90, direction: "up" };
const tray = { ...head, base: { outline: square }, flanges: [front] };
const channel = { ...head, profile: { width: 100, legs: [40, 60, 40], bends: [{ angle: 90, direction: "up" }, { angle: 90, direction: "up" }] } };

/** What reading, then building says, as "path: message" lines; empty when the part is right. */
function problems(json: unknown): readonly string[] {
  const read = readPartDocument(json);
  const found = read.ok ? buildPart(read.value, { materials: materialById }) : read;
  return found.ok ? [] : found.error.map(({ path, message }) => `${path}: ${message}`);
}

const withFlange = (more: object, ...others: object[]) => ({ ...tray, flanges: [{ ...front, ...more }, ...others] });
const withOutline = (outline: unknown) => ({ ...tray, base: { outline }, flanges: [] });

test("the examples of the format are right", () => {
  expect(problems(tray)).toEqual([]);
  expect(problems(channel)).toEqual([]);
  expect(problems(withFlange({}, { id: "back", on: "front", edge: 2, length: 12, angle: 90, direction: "up" }))).toEqual([]);
  expect(problems({ ...head, name: "<b>bold</b> & 'quoted'", base: { outline: square } })).toEqual([]);
});

test("a document without bends is a flat blank", () => {
  expect(problems({ ...head, profile: { width: 100, legs: [40], bends: [] } })).toEqual([]);
});

describe("what is wrong is said at its field, in the document's units", () => {
  test.each<[string, unknown, string]>([
    ["not an object", "hello", ": must be an object"],
    ["nothing", null, ": must be an object"],
    ["unknown key", { ...tray, colour: "red" }, "colour: is not a field of a part document"],
    ["unknown key inside", withFlange({ lenght: 3 }), "flanges[0].lenght: is not a field of a part document"],
    ["another format", { ...tray, format: "part/2" }, 'format: must be "part/1"'],
    ["no shape", head, ": must hold exactly one of: profile, base (with flanges), flat"],
    ["two shapes", { ...tray, profile: channel.profile }, ": must hold exactly one of: profile, base (with flanges), flat"],
    ["flanges on a profile", { ...channel, flanges: [] }, "flanges: belong to a base; a profile or a flat has its bends inside"],
    ["thickness 0", { ...tray, thickness: 0 }, "thickness: must be more than 0"],
    ["thickness below 0", { ...tray, thickness: -1 }, "thickness: must be more than 0"],
    ["thickness as text", { ...tray, thickness: "1.5" }, "thickness: must be a finite number"],
    ["thickness missing", { ...tray, thickness: undefined }, "thickness: is missing"],
    ["thickness not a number", { ...tray, thickness: NaN }, "thickness: must be a finite number"],
    ["thickness without end", { ...tray, thickness: Infinity }, "thickness: must be a finite number"],
    ["plate instead of sheet", { ...tray, thickness: 250 }, "thickness: 250 mm is beyond what is taken here; it must be at most 100 mm"],
    ["absurd length", withFlange({ length: 1e9 }), "flanges[0].length: 1000000000 mm is beyond what is taken here; it must be at most 100000 mm"],
    ["endless name", { ...tray, name: "x".repeat(201) }, "name: must be at most 200 characters"],
    ["angle 0", withFlange({ angle: 0 }), "flanges[0].angle: must be over 0 (0 = flat, no bend) and at most 180 degrees turned through"],
    ["angle over 180", withFlange({ angle: 181 }), "flanges[0].angle: must be over 0 and at most 180 degrees turned through"],
    ["unknown direction", withFlange({ direction: "left" }), 'flanges[0].direction: must be "up" or "down"'],
    ["id with a separator", withFlange({ id: "a+b" }), "flanges[0].id: must not hold '+', ',' or control characters, nor start or end with a space"],
    ["id base", withFlange({ id: "base" }), 'flanges[0].id: "base" is the base\'s own name; choose another'],
    ["same id twice", withFlange({}, { ...front, edge: 1 }), 'flanges[1].id: "front" is already the name of flanges[0]; each flange needs a name of its own'],
    ["unknown face", withFlange({ on: "rear" }), 'flanges[0].on: there is no face "rear"; it must be one of: "base", "front"'],
    ["edge that is not there", withFlange({ edge: 4 }), 'flanges[0].edge: "base" has no edge 4; its edges are 0 to 3'],
    ["half an edge", withFlange({ edge: 0.5 }), "flanges[0].edge: must be a whole number: edge k runs from vertex k to vertex k + 1"],
    ["own bend as edge", withFlange({}, { ...front, id: "b", on: "front" }), 'flanges[1].edge: edge 0 of "front" is its own bend; use edge 1 (end side), 2 (far edge) or 3 (start side)'],
    ["edge bent twice", withFlange({}, { ...front, id: "b" }), 'flanges[1].edge: edge 0 of "base" is already bent by "front" there; give both insets (start, end) that keep them apart'],
    ["curved edge", { ...tray, base: { outline: [[0, 0, 0.2], [200, 0], [200, 120], [0, 120]] } }, 'flanges[0].edge: edge 0 of "base" is curved; a bend needs a straight edge'],
    ["circle of parents", withFlange({ on: "b", edge: 2 }, { ...front, id: "b", on: "front", edge: 2 }), 'flanges[0].on: "front" hangs on itself through "b"; every chain of flanges must begin on the base'],
    ["crossing outline", withOutline([[0, 0], [100, 100], [100, 0], [0, 50]]), "base.outline: edges 0 and 2 cross or touch at 33.333 mm, 33.333 mm; the outline must not cross itself"],
    ["clockwise outline", withOutline([...square].reverse()), "base.outline: the outline runs clockwise; list its vertices counter-clockwise, as seen from the top"],
    ["repeated vertex", withOutline([[0, 0], [200, 0], [200, 0], [0, 120]]), "base.outline[1]: edge 1 has no length: vertices 1 and 2 are the same point; leave one out (the outline closes by itself)"],
    ["two vertices", withOutline([[0, 0], [200, 0]]), "base.outline: needs at least 3 vertices"],
    ["vertex of four", withOutline([[0, 0, 0, 0], [200, 0], [0, 120]]), "base.outline[0]: must be [x, y] or [x, y, bulge]"],
    ["unknown material", { ...tray, material: "unobtainium" }, `material: "unobtainium" is not known; it must be one of: DC01, DC04, S235, S275, S355, 1.4301, 1.4401, AW-5052-H32, AW-5754-H22, AW-5754-H111, AW-6061-T6, Cu-DHP-R220, Cu-DHP-R240, CuZn37-R300, CuZn37-R350`],
    ["legs and bends do not match", { ...channel, profile: { ...channel.profile, legs: [40, 60] } }, "profile.bends: 2 legs need 1 bends between them, not 2"],
    ["leg of 0", { ...channel, profile: { ...channel.profile, legs: [40, 0, 40] } }, "profile.legs[1]: must be more than 0"],
    ["leg between two bends too short", { ...channel, profile: { ...channel.profile, legs: [40, 5, 40] } }, 'profile.legs[1]: 5 mm is too short: bend "b1" takes 3 mm and bend "b2" takes 3 mm; it must be more than 6 mm'],
    ["first leg too short", { ...channel, profile: { ...channel.profile, legs: [3, 60, 40] } }, 'profile.legs[0]: 3 mm is too short: bend "b1" takes 3 mm; it must be more than 3 mm'],
    ["flange shorter than its setback", withFlange({ length: 2 }), 'flanges[0].length: 2 mm is too short: bend "front" takes 3 mm; it must be more than 3 mm'],
    ["short in inches", { ...tray, units: "in", thickness: 0.06, insideRadius: 0.06, base: { outline: [[0, 0], [8, 0], [8, 5], [0, 5]] }, flanges: [{ ...front, length: 0.1 }] }, 'flanges[0].length: 0.1 in is too short: bend "front" takes 0.12 in; it must be more than 0.12 in'],
    ["base smaller than its bends", { ...tray, base: { outline: [[0, 0], [200, 0], [200, 5], [0, 5]] }, flanges: [front, { ...front, id: "back", edge: 2 }] }, 'base.outline: 5 mm is too short: bend "front" takes 3 mm and bend "back" takes 3 mm; it must be more than 6 mm'],
    ["no length", withFlange({ length: undefined }), "flanges[0].length: is missing: give the flange's length, or an outline of its own"],
    ["insets longer than the edge", withFlange({ start: 120, end: 90 }), 'flanges[0].start: the insets leave nothing of edge 0 of "base", which is 200 mm long'],
    ["sides that meet", withFlange({ length: 130, startAngle: 45, endAngle: 45 }), "flanges[0].startAngle: the sides meet before the far edge; make the flange shorter or the angles nearer to 90"],
    ["hem that is no hem", withFlange({ hem: "closed" }), "flanges[0].angle: is 90, but a hem is turned through 180 degrees"],
    ["open hem without gap", withFlange({ angle: 180, hem: "open" }), "flanges[0].gap: is missing: a hem that is open needs the clear gap inside it"],
    ["gap without hem", withFlange({ gap: 2 }), 'flanges[0].gap: belongs to a hem; give "hem" or leave the gap out'],
    ["rule k without K", { ...tray, rule: "k" }, 'kFactor: is missing: the rule "k" needs the K-factor'],
    ["K over 1", { ...tray, kFactor: 1.2 }, "kFactor: must be over 0 and at most 1"],
    ["hole over the edge", { ...tray, base: { outline: square, holes: [{ circle: [199, 60], diameter: 20 }] } }, "base.holes[0]: the hole reaches over the edge of the sheet; move it inwards or make it smaller"],
    ["hole over the end of the bend", withFlange({ holes: [{ circle: [1, 2], diameter: 6 }] }), "flanges[0].holes[0]: the hole reaches over the edge of the sheet; move it inwards or make it smaller"],
    ["holes over one another", { ...tray, base: { outline: square, holes: [{ circle: [100, 60], diameter: 20 }, { slot: [[105, 60], [130, 60]], width: 8 }] } }, "base.holes[1]: the hole overlaps base.holes[0]"],
    ["hole of no kind", { ...tray, base: { outline: square, holes: [{ diameter: 4 }] } }, "base.holes[0]: must be one of: circle with diameter, slot with width, polygon"],
    ["flats that overlap", { ...tray, base: { outline: [[0, 0], [200, 0], [200, 60], [100, 60], [100, 120], [0, 120]] }, flanges: [{ ...front, id: "a", edge: 2 }, { ...front, id: "b", edge: 3 }] }, 'flanges[1]: "b" and "a" overlap in the unfolded sheet, so they cannot be cut from one piece; shorten one, inset it (start, end) or taper its sides'],
    ["two flanges that lap along one edge", withFlange({ end: 90 }, { ...front, id: "b", start: 100 }), 'flanges[1].edge: edge 0 of "base" is already bent by "front" there; give both insets (start, end) that keep them apart'],
    ["mitre without a gap", { ...tray, corner: { kind: "mitre" } }, "corner.gap: is missing: a mitre needs the gap that stays between the flanges"],
    ["gap of an open corner", withFlange({ corner: { kind: "open", gap: 1 } }), "flanges[0].corner.gap: belongs to a mitre only"],
    ["corners that disagree", withFlange({ corner: { kind: "open" } }, { ...front, id: "b", edge: 1, corner: { kind: "mitre", gap: 1 } }), 'flanges[1].corner: disagrees with the corner of "front", which meets "b" there; give one of the two, or both the same'],
    ["mitres that leave nothing", { ...tray, corner: { kind: "mitre", gap: 300 }, flanges: [0, 1, 2, 3].map((edge) => ({ ...front, id: `s${edge}`, edge })) }, 'flanges[0].edge: edge 0 of "base" is too short for this bend: the mitres at its ends leave nothing of it'],
    ["offset too low", withFlange({ offset: { height: 3 } }), "flanges[0].offset.height: 3 mm is too low for two bends of 90 degrees, which take 4.5 mm; make the offset higher or its angle less than 70.5 degrees"],
    ["offset past square", withFlange({ angle: 120, offset: { height: 8 } }), "flanges[0].angle: is 120, but the two bends of an offset turn at most 90 degrees each"],
    ["offset hem", withFlange({ angle: 180, hem: "closed", offset: { height: 8 } }), "flanges[0].hem: must be left out when the flange is offset"],
    ["name of a step taken", withFlange({ angle: 60, offset: { height: 8 } }, { ...front, id: "front-step", edge: 1 }), 'flanges[1].id: "front-step" is the name of the step of "front" (flanges[0]); choose another'],
    ["stroke with a stranger", withFlange({ strokeWith: "nobody" }), 'flanges[0].strokeWith: there is no bend "nobody"'],
    ["stroke with one that turns the same way", withFlange({}, { ...front, id: "b", on: "front", edge: 2, strokeWith: "front" }), 'flanges[1].strokeWith: "front" and "b" turn the same way; an offset turns one way and back'],
    ["stroke with one on another edge", withFlange({}, { ...front, id: "b", edge: 2, direction: "down", strokeWith: "front" }), 'flanges[1].strokeWith: "front" and "b" do not lie on one face, one behind the other; only such a pair is formed in one stroke'],
    ["teardrop too short to close", withFlange({ angle: 180, hem: "teardrop", gap: 8, length: 9 }), "flanges[0].length: 9 mm is too short: the leg has to close the loop, so it must be at least 9.5 mm"],
    ["teardrop turned too far", withFlange({ angle: 280, hem: "teardrop", gap: 8 }), "flanges[0].angle: must be over 0 and at most 180 degrees turned through"],
    ["over 180 without a hem", withFlange({ angle: 200 }), "flanges[0].angle: must be over 0 and at most 180 degrees turned through"],
    ["flat whose base point is nowhere", { ...head, flat: { outline: square, bends: [{ id: "a", line: [[100, 0], [100, 120]], angle: 90, direction: "up" }], base: [300, 300] } }, "flat.base: must be a point within one of the faces"],
    ["outline of its own off the bend", withFlange({ length: undefined, outline: [[0, 1], [50, 1], [50, 20], [0, 20]] }), "flanges[0].outline: its edge 0 must run along the bend's outside line: vertices 0 and 1 at [x, 0], the second further on, and nothing below 0 mm"],
    ["outline of its own wider than the edge", withFlange({ length: undefined, start: 160, outline: [[0, 0], [50, 0], [50, 20], [0, 20]] }), 'flanges[0].outline: is wider at the bend than the straight part of edge 0 of "base": it runs from 160 mm to 210 mm along the edge, which is straight there from 160 mm to 200 mm'],
  ])("%s", (_, json, expected) => {
    expect(problems(json)).toContain(expected);
  });

  test("more than 500 bends", () => {
    const many = Array.from({ length: 501 }, () => ({ angle: 90, direction: "up" }));
    expect(problems({ ...channel, profile: { width: 100, legs: Array.from({ length: 502 }, () => 20), bends: many } })).toContain("profile.bends: must be at most 500 entries");
  });

  test("several problems are told together", () => {
    expect(problems(withFlange({ length: 2 }, { ...front, id: "right", edge: 1, length: 1 }))).toHaveLength(2);
  });

  test("nothing is thrown for nonsense", () => {
    for (const json of [undefined, 3, [], { format: "part/1" }, { ...tray, flanges: "x" }, { ...tray, base: [] }, { ...tray, flanges: [null] }]) {
      expect(problems(json).length).toBeGreaterThan(0);
    }
  });
});
