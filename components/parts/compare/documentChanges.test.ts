import { describe, expect, it } from "vitest";
import type { PartDocument } from "@/bending/part/partDocument";
import { documentChanges } from "./documentChanges";

const tray: PartDocument = {
  format: "part/1", name: "Tray", units: "mm", material: "S235", thickness: 1.5, base: { outline: [[0, 0], [200, 0], [200, 120], [0, 120]], holes: [{ circle: [100, 60], diameter: 20 }] },
  flanges: [{ id: "front", on: "base", edge: 0, length: 30, angle: 90, direction: "up" }, { id: "left", on: "base", edge: 3, length: 20, angle: 90, direction: "up" }],
};
const said = (older: PartDocument, newer: PartDocument) => documentChanges(older, newer).map(({ name, before, after }) => [name, before, after]);

describe("the changes between two revisions", () => {
  it("are none for the same document", () => expect(documentChanges(tray, tray)).toEqual([]));

  it("name each field in the words of the form, with units", () => {
    const flanges = (tray.flanges ?? []).map((flange) => (flange.id === "front" ? { ...flange, length: 32.5, angle: 88 } : flange));
    const newer: PartDocument = { format: "part/1", name: "Tray", units: "mm", material: "S235", thickness: 2, base: tray.base ?? { outline: [] }, flanges };
    expect(said(tray, newer)).toEqual([
      ["Thickness", "1.5 mm", "2 mm"],
      ["Flange front, length", "30 mm", "32.5 mm"],
      ["Flange front, angle", "90°", "88°"],
    ]);
  });

  it("follow a flange by its name, wherever it stands in the list", () => {
    const [front, left] = tray.flanges ?? [];
    if (front === undefined || left === undefined) throw new Error("the tray has two flanges");
    expect(documentChanges(tray, { ...tray, flanges: [left, front] })).toEqual([]);
    expect(said(tray, { ...tray, flanges: [left] }).map(([name, , after]) => [name, after])).toEqual([
      ["Flange front, stands on", null], ["Flange front, edge", null], ["Flange front, length", null], ["Flange front, angle", null], ["Flange front, direction", null],
    ]);
  });

  it("see through a change of unit", () => {
    const inches: PartDocument = { format: "part/1", name: "L", units: "in", material: "S235", thickness: 0.25, profile: { width: 10, legs: [1, 2], bends: [{ angle: 90, direction: "up" }] } };
    const millimetres: PartDocument = { ...inches, units: "mm", thickness: 6.35, profile: { width: 254, legs: [25.4, 50.8], bends: [{ angle: 90, direction: "up" }] } };
    const longer: PartDocument = { ...inches, profile: { width: 10, legs: [1, 2.5], bends: [{ angle: 90, direction: "up" }] } };
    expect(said(inches, longer)).toEqual([["Leg 2", "2 in", "2.5 in"]]);
    expect(said(inches, millimetres)).toEqual([["Unit", "inches", "mm"]]);
  });
});
