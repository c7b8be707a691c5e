import { mmPer, type LengthUnit } from "@/bending/core/units";
import { formatNumber } from "@/lib/format/formatNumber";
import { newBend, newFlange, newLeg, noCorner, noRelief, rowKey } from "./newRows";
import type { LegDraft, PartDraft } from "./partDraft";

export type QuickStart = "L" | "U" | "Z" | "hat" | "tray";

export const quickStarts: readonly { readonly id: QuickStart; readonly label: string; readonly says: string }[] = [
  { id: "L", label: "L", says: "Angle: two legs" },
  { id: "U", label: "U", says: "Channel: three legs, both bends up" },
  { id: "Z", label: "Z", says: "Offset: three legs, one bend up, one down" },
  { id: "hat", label: "Hat", says: "Hat: five legs" },
  { id: "tray", label: "Tray", says: "Base with a flange on each of four edges" },
];

const sections: Readonly<Record<Exclude<QuickStart, "tray">, { readonly legs: readonly number[]; readonly turns: string }>> = {
  L: { legs: [40, 60], turns: "u" },
  U: { legs: [40, 80, 40], turns: "uu" },
  Z: { legs: [30, 60, 30], turns: "ud" },
  hat: { legs: [20, 40, 60, 40, 20], turns: "uddu" },
};

/** Lengths of a quick start: millimetres, or the nearest eighth of an inch. */
const say = (valueMm: number, units: LengthUnit): string =>
  units === "mm" ? String(valueMm) : formatNumber(Math.max(1, Math.round((valueMm / mmPer(units)) * 8)) / 8, 3);

function legsOf(start: Exclude<QuickStart, "tray">, units: LengthUnit): readonly LegDraft[] {
  const { legs, turns } = sections[start];
  return legs.map((length, i) => newLeg(say(length, units), newBend("90", turns[i] === "d" ? "down" : "up")));
}

/** Puts the shape of a quick start into a draft; material, thickness and the rest stay. */
export function withQuickStart(draft: PartDraft, start: QuickStart): PartDraft {
  const { units } = draft;
  if (start !== "tray") return { ...draft, shape: "profile", legs: legsOf(start, units), width: draft.width === "" ? say(300, units) : draft.width };
  const sides = ["front", "right", "back", "left"].map((id, edge) => newFlange(id, "base", edge, say(25, units)));
  return { ...draft, shape: "base", base: { ...draft.base, kind: "rectangle", width: say(200, units), depth: say(120, units), holes: [] }, flanges: sides };
}

export function startDraft(material: string): PartDraft {
  const blank: PartDraft = {
    number: "", name: "", note: "", units: "mm", material, thickness: "2", radiusFrom: "die", insideRadius: "", kFactor: "", rule: "default", dimension: "outside",
    toleranceAngle: "", toleranceLength: "", grain: "absent", grainAngle: "", relief: noRelief, corner: noCorner, shape: "profile", width: "300", legs: [], flanges: [], flat: null, flatBends: [],
    base: {
      kind: "rectangle", width: "200", depth: "120", holes: [],
      vertices: [[0, 0], [200, 0], [200, 120], [0, 120]].map(([x, y]) => ({ key: rowKey(), x: String(x), y: String(y), bulge: "" })),
    },
  };
  return withQuickStart(blank, "U");
}
