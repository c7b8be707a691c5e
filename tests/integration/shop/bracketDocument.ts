import type { PartDocument } from "@/bending/part/partDocument";

/** An L of two legs, 150 mm wide. */
export const bracketDocument: PartDocument = {
  format: "part/1", name: "Bracket", units: "mm", material: "S235", thickness: 2, insideRadius: 2, kFactor: 0.44, rule: "k",
  profile: { width: 150, legs: [40, 60], bends: [{ angle: 90, direction: "up" }] },
};
