import { describe, expect, it } from "vitest";
import { deg, mm, toRad } from "../core/units";
import { signedArea } from "../geometry/signedArea";
import { readToolingDocument } from "./readToolingDocument";
import { straightPunchProfile } from "./straightPunchProfile";
import { toolToDocument } from "./toolToDocument";
import { vDieProfile } from "./vDieProfile";

const punchProfile = straightPunchProfile({ tipAngle: toRad(deg(88)), tipRadius: mm(0.8), height: mm(120), bodyWidth: mm(26) });
const dieProfile = vDieProfile({ vOpening: mm(16), vAngle: toRad(deg(86)), shoulderRadius: mm(2), height: mm(60), bodyWidth: mm(50) });
const punch = {
  id: "P88", kind: "punch", profile: punchProfile, tipAngle: 88, tipRadius: 0.8, height: 120, maxForcePerMetre: 1000, tang: "20 mm",
  sections: [{ length: 100, count: 2 }, { length: 835 }, { length: 100, horn: "left", pieces: ["P88-H1"], rack: "A-03" }],
};
const die = { id: "V16", kind: "die", profile: dieProfile, vOpening: 16, vAngle: 86, shoulderRadius: 2, height: 60, maxForcePerMetre: 1000, tang: "60 mm", sections: [] };
const read = (...tools: readonly object[]) => readToolingDocument({ format: "tooling/1", units: "mm", tools });
const problems = (...tools: readonly object[]) => {
  const result = read(...tools);
  return result.ok ? [] : result.error.map(({ path, message }) => `${path}: ${message}`);
};

describe("readToolingDocument", () => {
  it("reads tools, gives every piece a mark, longest first", () => {
    const result = read(punch, die);
    expect(result.ok && result.value.map(({ id, kind }) => [id, kind])).toEqual([["P88", "punch"], ["V16", "die"]]);
    expect(result.ok && result.value[0]?.pieces).toEqual([
      { id: "P88-835-1", length: 835, horn: null, rack: null },
      { id: "P88-100-1", length: 100, horn: null, rack: null },
      { id: "P88-100-2", length: 100, horn: null, rack: null },
      { id: "P88-H1", length: 100, horn: "left", rack: "A-03" },
    ]);
  });

  it("reads inches into millimetres", () => {
    const scaled = { ...punch, profile: punchProfile.map(([x, y]) => [x / 25.4, y / 25.4]), tipRadius: 0.8 / 25.4, height: 120 / 25.4, sections: [{ length: 4 }] };
    const result = readToolingDocument({ format: "tooling/1", units: "in", tools: [scaled] });
    expect(result.ok && result.value[0]?.height).toBeCloseTo(120, 9);
    expect(result.ok && result.value[0]?.pieces[0]?.length).toBeCloseTo(101.6, 9);
  });

  it("turns every profile counter-clockwise", () => {
    const result = read({ ...punch, profile: [...punchProfile].reverse() });
    expect(result.ok && signedArea(result.value[0]?.profile ?? [])).toBeGreaterThan(0);
  });

  it("takes what it gives: a document written from tools reads as the same tools", () => {
    const first = read(punch, die);
    expect(first.ok).toBe(true);
    if (!first.ok) return;
    expect(read(...first.value.map(toolToDocument))).toEqual(first);
  });

  it("takes a V drawn with plain corners at the arcs' tops", () => {
    const plain = [[-25, 0], [-8, 0], [0, -8.6], [8, 0], [25, 0], [25, -60], [-25, -60]];
    expect(problems({ ...die, profile: plain })).toEqual([]);
  });

  it.each([
    ["crossing profile", { ...punch, profile: [[0, 0], [13, 20], [-13, 120], [13, 120], [-13, 20]] }, /^tools\[0\]\.profile: crosses itself: edge 1 and edge 3 meet at \(0 mm, 70 mm\)/],
    ["punch upside down", { ...punch, profile: punchProfile.map(([x, y]) => [x, -y]) }, /^tools\[0\]\.profile: a punch's tip must be at the origin/],
    ["punch off the axis", { ...punch, profile: punchProfile.map(([x, y]) => [x + 3, y]) }, /move the profile by \(-3 mm, 0 mm\)/],
    ["punch too short for its height", { ...punch, height: 150 }, /^tools\[0\]\.height: is 150 mm, but the profile ends 120 mm over the tip/],
    ["die upside down", { ...die, profile: dieProfile.map(([x, y]) => [x, -y]) }, /^tools\[0\]\.profile: a die's top plane must be at y = 0/],
    ["die off the axis", { ...die, profile: dieProfile.map(([x, y]) => [x + 2, y]) }, /^tools\[0\]\.profile: the V's centre on the top plane must be at the origin, but it is at x = 2 mm/],
    ["another V", { ...die, vOpening: 12 }, /^tools\[0\]\.vOpening: is 12 mm, but between the tops of the shoulder arcs the profile opens 16 mm/],
    ["another V angle", { ...die, vAngle: 78 }, /^tools\[0\]\.vAngle: is 78\.0 degrees, but the walls of the profile's V stand at 86\.0 degrees/],
    ["another shoulder", { ...die, shoulderRadius: 1 }, /^tools\[0\]\.shoulderRadius: is 1 mm, but the profile stands/],
    ["die height", { ...die, height: 90 }, /^tools\[0\]\.height: is 90 mm, but the profile ends 60 mm under the top plane/],
    ["thickness nothing", { ...punch, height: 0 }, /^tools\[0\]\.height: must be over 0/],
    ["missing field", { ...punch, tang: undefined }, /^tools\[0\]\.tang: is missing; give what the tool is held by/],
    ["unknown key", { ...punch, colour: "red" }, /^tools\[0\]\.colour: "colour" is not a field here/],
    ["unknown kind", { ...punch, kind: "hammer" }, /^tools\[0\]\.kind: must have the kind "punch" or "die"/],
    ["marks and count", { ...punch, sections: [{ length: 100, count: 2, pieces: ["a"] }] }, /^tools\[0\]\.sections\[0\]\.pieces: names 1 pieces, but the count is 2/],
    ["marks twice", { ...punch, sections: [{ length: 100, pieces: ["a"] }, { length: 50, pieces: ["a"] }] }, /the mark "a" stands on two pieces/],
    ["two points", { ...punch, profile: [[0, 0], [1, 1]] }, /^tools\[0\]\.profile: must have 3 points or more/],
  ])("explains: %s", (_, tool, message) => {
    expect(problems(tool)).toEqual([expect.stringMatching(message)]);
  });

  it("finds a code that stands on two tools", () => {
    expect(problems(punch, punch)).toEqual(['tools[1].id: "P88" stands on two tools; each tool needs its own']);
  });
});
