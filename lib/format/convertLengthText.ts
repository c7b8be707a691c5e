import { mmPer, type LengthUnit } from "@/bending/core/units";
import { formatNumber } from "./formatNumber";
import { parseLength } from "./parseLength";

/** What was typed, said in another unit; what cannot be read, and what names its own unit, stays as typed. */
export function convertLengthText(text: string, from: LengthUnit, to: LengthUnit): string {
  if (from === to || /[a-z"'”″]/i.test(text)) return text;
  const value = parseLength(text, from);
  if (!value.ok) return text;
  return formatNumber((value.value * mmPer(from)) / mmPer(to), to === "in" ? 5 : 4);
}
