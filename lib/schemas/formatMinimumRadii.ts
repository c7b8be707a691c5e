import type { MinimumRadiusTable } from "@/bending/handbook/material";

/**
 * A table of smallest radii on one line: `up to 1: 1 / 1.2; up to 1.5: 1.6 / 2`, thickness, then the radius across and along the
 * rolling direction, all in mm; radii that are multiples of the thickness end in t: `up to 0.5: 0.5t`.
 */
export function formatMinimumRadii(table: MinimumRadiusTable | null): string {
  if (table === null) return "";
  const unit = table.as === "mm" ? "" : "t";
  return table.rows.map(({ upTo, across, along }) => `up to ${upTo}: ${across}${unit}${along === null ? "" : ` / ${along}${unit}`}`).join("; ");
}
