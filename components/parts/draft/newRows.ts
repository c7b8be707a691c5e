import type { BendDirection } from "@/bending/part/partDocument";
import type { BendDraft, FlangeDraft, LegDraft } from "./partDraft";

let count = 0;
/** A key that no other row of this page has. */
export const rowKey = (): string => `row${Date.now().toString(36)}-${(count += 1)}`;

export const newBend = (angle = "90", direction: BendDirection = "up"): BendDraft =>
  ({ angle, direction, insideRadius: "", kFactor: "", hem: "none", gap: "", toleranceAngle: "" });

export const newLeg = (length: string, bend: BendDraft = newBend()): LegDraft => ({ key: rowKey(), length, bend });

export const newFlange = (id: string, on: string, edge: number, length: string): FlangeDraft => ({
  ...newBend(), key: rowKey(), id, on, edge, length, start: "", end: "", startAngle: "", endAngle: "", dimension: "part",
  relief: "none", reliefWidth: "", reliefDepth: "", toleranceLength: "", holes: [], outline: null,
});
