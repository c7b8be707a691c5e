import { groupMeasurements } from "./groupMeasurements";
import type { SheetMeasurement } from "./sheetView";

/** What to measure as a table for paper; the last column stands only where the plan knows what to expect. */
export function measurementTable(measurements: readonly SheetMeasurement[]): { readonly heads: readonly string[]; readonly rows: readonly (readonly string[])[]; readonly note: string } {
  const sources = [...new Set(measurements.map(({ source }) => source))].join(", ");
  const grouped = groupMeasurements(measurements);
  const known = grouped.some(({ expected }) => expected !== "");
  return {
    heads: ["What", "Nominal", "Tolerance", ...(known ? ["At worst"] : [])],
    rows: grouped.map(({ what, nominal, tolerance, expected }) => [what, nominal, tolerance, ...(known ? [expected] : [])]),
    note: `Tolerances: ${sources}.${known ? " At worst: what this order and the brake’s repeatability let it miss." : ""}`,
  };
}
