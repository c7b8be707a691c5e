import { mmPer, type LengthUnit } from "@/bending/core/units";
import { formatNumber } from "./formatNumber";

/** Decimals that make sense in the shop: 0.01 mm, 0.001 in. */
export const lengthDigits = (unit: LengthUnit): number => (unit === "in" ? 3 : 2);

/** A length in millimetres, said in `unit`, without trailing zeros: `12.5 mm`. */
export function formatLength(valueMm: number, unit: LengthUnit, withUnit = true): string {
  const text = formatNumber(valueMm / mmPer(unit), lengthDigits(unit));
  return withUnit ? `${text} ${unit}` : text;
}
