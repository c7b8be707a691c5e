import type { LengthUnit } from "@/bending/core/units";
import { quantityKinds, type QuantityKind } from "@/lib/format/quantityKind";

const exponent = /\d[\d.,]*e[+-]?\d+/gi;
const namesUnit = /[a-zµ"'°”″]/i;
const fraction = /^[+-]?(?:\d+(?:\s+|-))?\d+\s*\/\s*\d+$/;

/** What was typed without a unit, with the unit that it was meant in: so that changing the system of units changes no size. */
export function keepUnit(text: string, kind: QuantityKind, system: LengthUnit): string {
  const { mm, in: inch } = quantityKinds[kind].unit;
  const typed = text.trim();
  if (mm === inch || typed === "" || namesUnit.test(typed.replace(exponent, "0"))) return text;
  const unit = quantityKinds[kind].unit[system];
  return fraction.test(typed) || !/[-+*/^]/.test(typed.slice(1)) ? `${typed} ${unit}` : `(${typed}) ${unit}`;
}
