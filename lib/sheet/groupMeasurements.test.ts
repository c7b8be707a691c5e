import { expect, it } from "vitest";
import { groupMeasurements } from "./groupMeasurements";
import type { SheetMeasurement } from "./sheetView";

const entry = (what: string, kind: "angle" | "length", nominal: string): SheetMeasurement =>
  ({ what, kind, nominal, tolerance: "±0.5", low: "", high: "", source: "", afterStep: null });

it("joins equal angles and keeps what differs apart", () => {
  const rows = groupMeasurements([
    entry("Included angle at b1", "angle", "90.0°"), entry("Included angle at b2", "angle", "90.0°"), entry("Included angle at b3", "angle", "45.0°"), entry("Width along the bends", "length", "120 mm"),
  ]);
  expect(rows.map((row) => row.what)).toEqual(["Included angle at b1, b2", "Included angle at b3", "Width along the bends"]);
});
