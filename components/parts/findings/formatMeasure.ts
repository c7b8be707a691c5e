import type { FindingMeasure } from "@/bending/findings/finding";
import type { LengthUnit } from "@/bending/core/units";
import { formatAngle } from "@/lib/format/formatAngle";
import { formatLength } from "@/lib/format/formatLength";
import { formatNumber } from "@/lib/format/formatNumber";

/** "6 → 8.4 mm": what is and what is wanted, in the part's unit. */
export function formatMeasure({ value, wanted, unit }: FindingMeasure, units: LengthUnit): string {
  switch (unit) {
    case "mm": return `${formatLength(value, units, false)} → ${formatLength(wanted, units)}`;
    case "deg": return `${formatAngle(value)} → ${formatAngle(wanted)}`;
    case "kN":
    case "kN/m":
    case "kg": return `${formatNumber(value, 0)} → ${formatNumber(wanted, 0)} ${unit}`;
    default: return unit satisfies never;
  }
}
