import { mmPer, type LengthUnit } from "./units";

/** A length in mm as a person reads it in the document's unit: "4.25 mm", "0.167 in". */
export function formatLength(lengthMm: number, units: LengthUnit): string {
  const value = lengthMm / mmPer(units);
  const places = units === "in" ? 4 : 3;
  return `${Number(value.toFixed(places))} ${units}`;
}
