import { expect, test } from "vitest";
import { applyCure } from "@/bending/findings/applyCure";
import type { Cure } from "@/bending/findings/finding";
import type { PartDocument } from "@/bending/part/partDocument";
import { documentFromDraft } from "../draft/documentFromDraft";
import { draftFromDocument } from "../draft/draftFromDocument";
import { cureOnDraft } from "./cureOnDraft";

const common = { format: "part/1", name: "Part", units: "mm", material: "S235", thickness: 2 } as const;
const profile: PartDocument = { ...common, profile: { width: 600, legs: [20, 40, 12], bends: [{ angle: 95, direction: "up", insideRadius: 1 }, { angle: 90, direction: "down" }] } };
const base: PartDocument = {
  ...common, relief: { kind: "round", width: 1 }, base: { outline: [[0, 0], [200, 0], [200, 120], [0, 120]], holes: [{ circle: [100, 6], diameter: 5 }] },
  flanges: [
    { id: "front", on: "base", edge: 0, length: 6, angle: 90, direction: "up", start: 5 },
    { id: "back", on: "base", edge: 2, length: 30, angle: 90, direction: "up", insideRadius: 1, relief: { kind: "rectangular", width: 1 }, holes: [{ circle: [100, 6], diameter: 5 }] }],
};
const flat: PartDocument = { ...common, flat: { outline: [[0, 0], [120, 0], [120, 80], [0, 80]], holes: [{ circle: [30, 20], diameter: 5 }], bends: [{ id: "b1", line: [[20, 0], [20, 80]], angle: 95, direction: "up", insideRadius: 1 }] } };

/** Every kind of field that a rule names. */
test.each<readonly [PartDocument, string]>([
  [profile, "profile.legs[0]"], [profile, "profile.legs[2]"], [profile, "profile.width"], [profile, "insideRadius"], [profile, "profile.bends[0].insideRadius"], [profile, "profile.bends[1].angle"],
  [base, "flanges[0].length"], [base, "flanges[0].angle"], [base, "flanges[1].insideRadius"], [base, "flanges[1].relief.width"], [base, "relief.width"],
  [base, "base.holes[0].circle[0]"], [base, "base.holes[0].circle[1]"], [base, "flanges[1].holes[0].circle[1]"],
  [flat, "flat.holes[0].circle[0]"], [flat, "flat.bends[0].insideRadius"], [flat, "flat.bends[0].angle"],
])("typed into the form a cure changes the document as it says: %#, %s", (document, path) => {
  const cure: Cure = { path, value: 12.5, says: "12.5 mm" };
  const cured = cureOnDraft(draftFromDocument(document), cure);
  expect(cured && documentFromDraft(cured, "steel")).toEqual({ document: applyCure(document, cure), problems: [] });
});

test("a relief is added as it would be chosen", () => {
  const cure: Cure = { path: "flanges[0].relief", value: { kind: "rectangular" }, says: "a rectangular relief" };
  const cured = cureOnDraft(draftFromDocument(base), cure);
  expect(cured && documentFromDraft(cured, "steel").document).toEqual(applyCure(base, cure));
});

test("a field that the form does not have is not offered", () => {
  for (const path of ["base.outline", "flanges[9].length", "profile.bends[0].direction", "base.holes[3].circle[0]"]) expect(cureOnDraft(draftFromDocument(base), { path, value: 1, says: "1 mm" })).toBeNull();
});
