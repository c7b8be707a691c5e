import type { SheetMeasurement } from "./sheetView";

/** Rows for paper: what has the same nominal and tolerance stands in one, "Included angle at b1, b2". */
export function groupMeasurements(measurements: readonly SheetMeasurement[]): readonly { readonly what: string; readonly nominal: string; readonly tolerance: string }[] {
  const groups = new Map<string, { what: string[]; nominal: string; tolerance: string }>();
  for (const { what, kind, nominal, tolerance } of measurements) {
    const lead = kind === "angle" ? "Included angle at " : "Flange ";
    const grouped = what.startsWith(lead) ? `${lead}|${nominal}|${tolerance}` : what;
    const group = groups.get(grouped);
    if (group) group.what.push(what.slice(lead.length));
    else groups.set(grouped, { what: [what], nominal, tolerance });
  }
  return [...groups.values()].map((group) => ({ ...group, what: group.what.join(", ") }));
}
