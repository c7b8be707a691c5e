import type { RecognisedPart } from "@/bending/exchange/step/recognisedPart";
import type { AllowanceRule } from "@/bending/part/partDocument";
import { formatNumber } from "@/lib/format/formatNumber";

/** What is typed while a recognised part is looked over. */
export interface ImportForm {
  readonly name: string;
  readonly number: string;
  readonly material: string;
  readonly rule: AllowanceRule | "default";
  readonly thickness: string;
  readonly bends: readonly BendForm[];
}

export interface BendForm {
  readonly insideRadius: string;
  readonly angle: string;
}

/** As found: lengths to a thousandth of a millimetre, angles to a thousandth of a degree. */
export function startImportForm(part: RecognisedPart, fileName: string, material: string): ImportForm {
  return {
    name: fileName.replace(/\.[^.]*$/, "").slice(0, 200), number: "", material, rule: "default",
    thickness: formatNumber(part.thickness, 3),
    bends: part.bends.map(({ insideRadius, angle }) => ({ insideRadius: formatNumber(insideRadius, 3), angle: formatNumber(degreesOf(angle), 3) })),
  };
}

export const degreesOf = (radians: number): number => (radians * 180) / Math.PI;

/** Every radius rounded to a step, as text. */
export const roundedTo = (value: number, step: number): string => formatNumber(Math.round(value / step) * step, 3);
