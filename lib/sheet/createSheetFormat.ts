import { MM_PER_INCH, type LengthUnit } from "@/bending/core/units";
import { formatFixed as fixed } from "@/lib/format/formatFixed";
import { formatNumber as trimmed } from "@/lib/format/formatNumber";

/** Numbers as a setup sheet states them; lengths are given in mm and written in the sheet's unit. */
export interface SheetFormat {
  readonly unit: LengthUnit;
  /** A length of a part or tool, with its unit. */
  readonly length: (millimetres: number) => string;
  /** A back-gauge value as it is keyed in, without unit. */
  readonly gauge: (millimetres: number) => string;
  /** A place along the bed from its middle, signed, without unit. */
  readonly place: (millimetres: number) => string;
  /** A small length (radius, depth, allowance), with its unit. */
  readonly fine: (millimetres: number) => string;
  readonly angle: (degrees: number) => string;
  readonly force: (kilonewtons: number) => string;
  readonly mass: (kilograms: number) => string;
  readonly area: (squareMillimetres: number) => string;
  readonly time: (seconds: number) => string;
  readonly ratio: (value: number) => string;
}

/** The one place where numbers of a sheet become text. */
export function createSheetFormat(unit: LengthUnit): SheetFormat {
  const inch = unit === "in";
  const inUnit = (millimetres: number): number => (inch ? millimetres / MM_PER_INCH : millimetres);
  const withUnit = (text: string): string => `${text} ${unit}`;
  return {
    unit,
    length: (millimetres) => withUnit(trimmed(inUnit(millimetres), inch ? 3 : 1)),
    gauge: (millimetres) => fixed(inUnit(millimetres), inch ? 3 : 2),
    place: (millimetres) => signed(inUnit(millimetres), inch ? 2 : 1),
    fine: (millimetres) => withUnit(fixed(inUnit(millimetres), inch ? 3 : 2)),
    angle: (degrees) => `${fixed(degrees, 1)}°`,
    force: (kilonewtons) => `${fixed(kilonewtons, kilonewtons < 10 ? 1 : 0)} kN`,
    mass: (kilograms) => `${fixed(kilograms, kilograms < 1 ? 3 : 2)} kg`,
    area: (squareMillimetres) =>
      inch ? `${fixed(squareMillimetres / MM_PER_INCH ** 2, 1)} in²` : `${fixed(squareMillimetres / 1e6, 4)} m²`,
    time: duration,
    ratio: (value) => fixed(value, 3),
  };
}

function signed(value: number, digits: number): string {
  const text = fixed(value, digits);
  return Number(text) > 0 ? `+${text}` : text;
}

function duration(seconds: number): string {
  const whole = Math.round(seconds);
  if (whole < 60) return `${whole} s`;
  const minutes = Math.floor(whole / 60);
  const rest = String(whole % 60).padStart(2, "0");
  if (minutes < 60) return `${minutes} min ${rest} s`;
  return `${Math.floor(minutes / 60)} h ${String(minutes % 60).padStart(2, "0")} min`;
}
