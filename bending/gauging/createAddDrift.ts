import type { PartModel } from "../part/partModel";
import type { Drift } from "./drift";
import type { GaugedStep } from "./gaugedStep";
import { angleEntry, type LinearForm } from "./linearForm";
import { opposedBend } from "./opposedBend";

/** Adds what the bends' errors do, times `factor`, to a sum over the steps' errors; `lines` has the lines of the steps that are known. */
export type AddDrift = (form: number[], drift: readonly Drift[], factor: number, lines: readonly LinearForm[]) => void;

/** Knows for every bend its step, and whether its line's error counts the other way. */
export function createAddDrift(part: PartModel, steps: readonly GaugedStep[]): AddDrift {
  const places = new Map(steps.flatMap((step, s) => step.bends.map((bend) => [bend, { s, sign: opposedBend(part, step, bend) ? -1 : 1 }] as const)));
  return (form, drift, factor, lines) => {
    for (const { bend, shift, turn } of drift) {
      const place = places.get(bend);
      if (place === undefined) continue;
      form[angleEntry(place.s)] = (form[angleEntry(place.s)] ?? 0) + factor * turn;
      lines[place.s]?.forEach((value, i) => { form[i] = (form[i] ?? 0) + factor * place.sign * shift * value; });
    }
  };
}
