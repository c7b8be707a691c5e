import { mm, type Mm, type Rad } from "../core/units";
import type { MaterialFacts, MinimumRadius } from "./material";

/** DIN 6935 (1975-10): beyond this a bend counts as one along the rolling direction. */
const FAR = (120 * Math.PI) / 180 + 1e-9;

/**
 * Smallest inside radius by the material's own table. Beyond 120 degrees it is the one along the rolling direction, where that
 * is told apart. Null where the table says nothing.
 */
export function minimumRadius(material: MaterialFacts, thickness: Mm, angle: Rad, alongGrain = false): MinimumRadius | null {
  const table = material.minimumRadii;
  const row = table?.rows.find(({ upTo }) => thickness <= upTo);
  if (!table || !row) return null;
  const toldApart = table.rows.some(({ along }) => along !== null);
  const value = toldApart && (alongGrain || angle > FAR) ? row.along : row.across;
  if (value === null) return null;
  const source = material.origins.minimumRadii.text;
  return { radius: mm(table.as === "mm" ? value : value * thickness), source: toldApart ? `${source}, ${alongGrain ? "along" : "across"} the rolling direction` : source };
}
