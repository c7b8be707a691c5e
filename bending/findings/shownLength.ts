import { mmPer, type LengthUnit } from "../core/units";

/** Places that a shop reads: 0.01 mm, 0.001 in. */
const PLACES = { mm: 100, in: 1000 } as const;

/** A length (mm) as a finding says it, in the document's unit; a least one is rounded `up`, so that keeping to it is enough. */
export function shownLength(lengthMm: number, units: LengthUnit, way: "near" | "up" = "near"): string {
  const value = (lengthMm / mmPer(units)) * PLACES[units];
  const rounded = (way === "up" ? Math.ceil(value - 1e-6) : Math.round(value)) / PLACES[units];
  return `${rounded} ${units}`;
}
