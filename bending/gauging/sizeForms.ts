import type { PartModel } from "../part/partModel";
import { dimensionSizes } from "./dimensionSizes";
import type { GaugedStep } from "./gaugedStep";
import { lineForms } from "./lineForms";
import { angleEntry, type LinearForm } from "./linearForm";
import type { PartDimension } from "./partDimension";
import { stepSlopes } from "./stepSlopes";

/** For every dimension, and each place where it may be measured, its error as a sum over the steps' errors. */
export function sizeForms(part: PartModel, steps: readonly GaugedStep[], dimensions: readonly PartDimension[]): readonly (readonly LinearForm[])[] {
  const lines = lineForms(part, steps);
  const counts = dimensions.map(({ from, to }) => from.length * to.length);
  const slopes = steps.map((_, s) => stepSlopes(part, steps, s, (bent) => dimensionSizes(part, bent, dimensions).flat()));
  let at = 0;
  return counts.map((count) => Array.from({ length: count }, (): LinearForm => {
    const place = at;
    at += 1;
    const form = new Array<number>(2 * steps.length).fill(0);
    slopes.forEach(({ shift, turn }, s) => {
      form[angleEntry(s)] = (form[angleEntry(s)] ?? 0) + (turn[place] ?? 0);
      lines[s]?.forEach((value, i) => { form[i] = (form[i] ?? 0) + (shift[place] ?? 0) * value; });
    });
    return form;
  }));
}
