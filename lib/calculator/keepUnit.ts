import type { LengthUnit } from "@/bending/core/units";
import { quantityKinds, type QuantityKind } from "@/lib/format/quantityKind";
import { namesUnit } from "./namesUnit";

const fraction = /^[+-]?(?:\d+(?:\s+|-))?\d+\s*\/\s*\d+$/;

/** What was typed without a unit, with the unit that it was meant in: so that changing the system of units changes no size. */
export function keepUnit(text: string, kind: QuantityKind, system: LengthUnit): string {
  const { mm, in: inch } = quantityKinds[kind].unit;
  const typed = text.trim();
  if (mm === inch || typed === "" || namesUnit(typed)) return text;
  const unit = quantityKinds[kind].unit[system];
  return fraction.test(typed) || !/[-+*/^]/.test(typed.slice(1)) ? `${typed} ${unit}` : `(${typed}) ${unit}`;
}
