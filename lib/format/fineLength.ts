import { mmPer, type LengthUnit } from "@/bending/core/units";
import { formatFixed } from "./formatFixed";
import { lengthDigits } from "./formatLength";

/** A small length in mm (a deduction, an uncertainty), always with the same decimals: `0.04 mm`, `0.002 in`. */
export function fineLength(valueMm: number, units: LengthUnit): string {
  return `${formatFixed(valueMm / mmPer(units), lengthDigits(units))} ${units}`;
}
