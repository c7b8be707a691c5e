import type { BendDirection } from "@/bending/part/partDocument";
import type { BendDraft, CornerDraft, FlangeDraft, HoleDraft, LegDraft, ReliefDraft } from "./partDraft";

let count = 0;
/** A key that no other row of this page has. */
export const rowKey = (): string => `row${Date.now().toString(36)}-${(count += 1)}`;

export const newBend = (angle = "90", direction: BendDirection = "up"): BendDraft =>
  ({ angle, direction, insideRadius: "", kFactor: "", hem: "none", gap: "", toleranceAngle: "", strokeWith: "" });

export const noRelief: ReliefDraft = { kind: "absent", width: "", depth: "" };
export const noCorner: CornerDraft = { kind: "absent", gap: "" };

export const newLeg = (length: string, bend: BendDraft = newBend()): LegDraft => ({ key: rowKey(), length, bend });

export const newFlange = (id: string, on: string, edge: number, length: string): FlangeDraft => ({
  ...newBend(), key: rowKey(), id, on, edge, length, start: "", end: "", startAngle: "", endAngle: "", dimension: "part",
  relief: noRelief, corner: noCorner, offsetHeight: "", toleranceLength: "", holes: [], outline: null,
});

export function newHole(kind: Exclude<HoleDraft["kind"], "kept">): HoleDraft {
  const at = { key: rowKey(), x: "", y: "" };
  switch (kind) {
    case "circle": return { ...at, kind, diameter: "" };
    case "slot": return { ...at, kind, toX: "", toY: "", width: "" };
    case "rectangle": return { ...at, kind, width: "", height: "" };
    default: return kind satisfies never;
  }
}
