import type { SheetMeasurement } from "./sheetView";

interface MeasurementRow { readonly what: string; readonly nominal: string; readonly tolerance: string; readonly expected: string }

/** What a row is about: "Included angle at" + "b1", or "Flange" + "front" + "outside". */
const shape = /^(Included angle at|Flange) ([^,]+)(?:, (\w+))?$/;

/** Rows for paper: what has the same nominal, tolerance and expectation stands in one, "Included angle at b1, b2". */
export function groupMeasurements(measurements: readonly SheetMeasurement[]): readonly MeasurementRow[] {
  const groups = new Map<string, { lead: string; names: string[]; end: string; nominal: string; tolerance: string; expected: string }>();
  for (const { what, nominal, tolerance, expected = "" } of measurements) {
    const [, lead = "", name = what, end = ""] = shape.exec(what) ?? [];
    const key = lead === "" ? what : [lead, end, nominal, tolerance, expected].join("|");
    const group = groups.get(key);
    if (group) group.names.push(name);
    else groups.set(key, { lead, names: [name], end, nominal, tolerance, expected });
  }
  return [...groups.values()].map(({ lead, names, end, nominal, tolerance, expected }) => ({
    what: `${lead} ${names.join(", ")}${end === "" ? "" : ` (${end})`}`.trim(), nominal, tolerance, expected,
  }));
}
