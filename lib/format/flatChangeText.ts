import { mmPer, type LengthUnit } from "@/bending/core/units";
import { formatFixed } from "./formatFixed";
import { lengthDigits } from "./formatLength";

export interface FlatSizes {
  readonly units: LengthUnit;
  readonly thenMm: readonly [number, number];
  readonly nowMm: readonly [number, number];
}

/** What is under this is rounding, mm. */
const SAME_MM = 1e-3;

/** A flat as it was and as it would be now, in as many decimals as tell the two apart; a side that stays is left out. */
export function flatChangeText({ units, thenMm, nowMm }: FlatSizes): { readonly then: string; readonly now: string } {
  const changed = [0, 1].filter((side) => Math.abs((thenMm[side] ?? 0) - (nowMm[side] ?? 0)) > SAME_MM);
  const sides = changed.length === 1 ? changed : [0, 1];
  const text = (size: readonly [number, number], digits: number) => `${sides.map((side) => formatFixed((size[side] ?? 0) / mmPer(units), digits)).join(" × ")} ${units}`;
  const digits = [0, 1, 2].map((more) => lengthDigits(units) + more).find((count) => text(thenMm, count) !== text(nowMm, count)) ?? lengthDigits(units);
  return { then: text(thenMm, digits), now: text(nowMm, digits) };
}
