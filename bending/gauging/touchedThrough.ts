import type { PartModel } from "../part/partModel";
import { bendsBetween } from "./bendsBetween";
import type { GaugedStep } from "./gaugedStep";

/** The earlier steps whose bends lie between step `s`'s line and what its fingers touch. */
export function touchedThrough(part: PartModel, steps: readonly GaugedStep[], s: number): readonly number[] {
  const step = steps[s];
  const parent = part.bends[step?.bends[0] ?? -1]?.parent;
  if (!step?.touch || parent === undefined) return [];
  const between = new Set(bendsBetween(part, parent, step.touch.face));
  return steps.slice(0, s).flatMap(({ bends }, earlier) => (bends.some((bend) => between.has(bend)) ? [earlier] : []));
}
