import { mmPer, type LengthUnit } from "../core/units";

/** A length in mm as people of that unit read it, with the unit: "16 mm", "0.63 in". */
export function lengthText(millimetres: number, units: LengthUnit): string {
  const digits = units === "in" ? 4 : 2;
  return `${Number((millimetres / mmPer(units)).toFixed(digits))} ${units}`;
}
