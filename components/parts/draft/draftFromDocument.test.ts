import fc from "fast-check";
import { describe, expect, it } from "vitest";
import type { PartDocument } from "@/bending/part/partDocument";
import { convertDraft } from "./convertDraft";
import { documentFromDraft } from "./documentFromDraft";
import { draftFromDocument } from "./draftFromDocument";

const common = { format: "part/1", name: "Part", units: "mm", material: "S235", thickness: 1.5 } as const;

const documents: readonly PartDocument[] = [
  { ...common, insideRadius: 2, kFactor: 0.44, rule: "k", dimension: "inside", toleranceAngle: 0.5, toleranceLength: 0.2,
    profile: { width: 600, legs: [20, 40.25, 12], bends: [{ angle: 90, direction: "up", insideRadius: 1, kFactor: 0.4, toleranceAngle: 1 }, { angle: 180, direction: "down", hem: "open", gap: 2 }] } },
  { ...common, base: { outline: [[0, 0], [200, 0], [200, 120], [0, 120]], holes: [{ circle: [100, 60], diameter: 20 }, { slot: [[10, 10], [30, 10]], width: 6 }] },
    flanges: [
      { id: "front", on: "base", edge: 0, length: 30, angle: 90, direction: "up", start: 2, end: 3, startAngle: 80, endAngle: 70, relief: { kind: "round", width: 2, depth: 4 }, toleranceLength: 0.3 },
      { id: "return", on: "front", edge: 2, length: 12, angle: 45, direction: "down", dimension: "tangent", holes: [{ polygon: [[1, 1], [3, 1], [2, 3]] }] },
      { id: "ear", on: "base", edge: 1, outline: [[0, 0], [50, 0], [40, 20], [10, 20]], angle: 90, direction: "up" }] },
  { ...common, grain: "x", relief: { kind: "round" }, corner: { kind: "mitre", gap: 0.5 },
    base: { outline: [[0, 0], [200, 0], [200, 120], [0, 120]], holes: [{ polygon: [[10, 20], [40.5, 20], [40.5, 35.25], [10, 35.25]] }] },
    flanges: [
      { id: "front", on: "base", edge: 0, length: 30, angle: 90, direction: "up", relief: { kind: "none" }, corner: { kind: "open" }, strokeWith: "step" },
      { id: "step", on: "front", edge: 2, length: 20, angle: 60, direction: "down", offset: { height: 3 } }] },
  { ...common, grain: 30, profile: { width: 50, legs: [10, 20, 30], bends: [{ angle: 45, direction: "up", strokeWith: "b2" }, { angle: 45, direction: "down" }] } },
  { ...common, base: { outline: [[0, 0], [100, 0, 0.2], [100, 80], [20, 90]] }, flanges: [] },
  { ...common, flat: { outline: [[0, 0], [120, 0], [120, 80], [0, 80]], bends: [{ id: "b1", line: [[20, 0], [20, 80]], angle: 90, direction: "up", insideRadius: 1 }] } },
];

describe("a draft", () => {
  it.each(documents.map((document, i) => [i, document] as const))("gives back the document it came from (%i)", (_, document) => {
    expect(documentFromDraft(draftFromDocument(document), "steel")).toEqual({ document, problems: [] });
  });

  it("means the same part in inches, to a hundredth of a millimetre", () => {
    fc.assert(fc.property(fc.array(fc.double({ min: 1, max: 3000, noNaN: true }), { minLength: 2, maxLength: 6 }), (legs) => {
      const bends = legs.slice(1).map(() => ({ angle: 90, direction: "up" as const }));
      const draft = draftFromDocument({ ...common, profile: { width: 100, legs, bends } });
      const read = documentFromDraft(convertDraft(draft, "in"), "steel");
      expect(read.problems).toEqual([]);
      const { profile } = read.document as { profile: { legs: readonly number[] } };
      profile.legs.forEach((leg, i) => expect(Math.abs(leg * 25.4 - (legs[i] ?? 0))).toBeLessThan(0.01));
    }));
  });

  it("names the field of every text that is no number", () => {
    const draft = draftFromDocument({ ...common, profile: { width: 100, legs: [10, 20], bends: [{ angle: 90, direction: "up" }] } });
    const wrong = { ...draft, thickness: "thick", width: "", legs: draft.legs.map((leg, i) => (i === 1 ? { ...leg, length: "1/0" } : { ...leg, bend: { ...leg.bend, angle: "square" } })) };
    expect(documentFromDraft(wrong, "steel").problems.map(({ path }) => path)).toEqual(["thickness", "profile.width", "profile.legs[1]", "profile.bends[0].angle"]);
  });
});
