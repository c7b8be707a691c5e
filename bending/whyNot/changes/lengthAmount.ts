import { mmPer, type LengthUnit } from "../../core/units";
import type { ChangeAmount } from "../../plan/planChange";
import { rounded } from "../../plan/rounded";

/** A length in mm as an amount in the document's unit. */
export const lengthAmount = (name: string, valueMm: number, units: LengthUnit, fromMm?: number): ChangeAmount =>
  ({ name, value: rounded(valueMm / mmPer(units)), unit: units, ...(fromMm === undefined ? {} : { from: rounded(fromMm / mmPer(units)) }) });
