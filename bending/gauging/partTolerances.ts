import { mm } from "../core/units";
import type { Frame } from "../geometry/frame";
import type { PartModel } from "../part/partModel";
import { bendMotion } from "./bendMotion";
import type { DimensionTolerance } from "./dimensionTolerance";
import { dimensionForm } from "./dimensionForm";
import { endPoint } from "./endPoint";
import { endPosition } from "./endPosition";
import type { GaugedStep, Repeats } from "./gaugedStep";
import type { LinearForm } from "./linearForm";
import { lineForms } from "./lineForms";
import type { PartDimension } from "./partDimension";
import { seenFrom } from "./seenFrom";
import { toleranceOfForm } from "./toleranceOfForm";

/**
 * The tolerance that adds up: for every dimension how far it may miss when the part is bent in these steps, each from
 * what its fingers touch. Of several places where a dimension may be measured the worst one is told.
 */
export function partTolerances(part: PartModel, steps: readonly GaugedStep[], repeats: Repeats, dimensions: readonly PartDimension[]): readonly DimensionTolerance[] {
  const motions = part.bends.map((bend) => bendMotion(part, bend));
  const lines = lineForms(part, steps, motions);
  const sizes = steps.flatMap(() => [repeats.gauge, repeats.angle]);
  const worstOf = (form: LinearForm) => form.reduce((sum, value, i) => sum + Math.abs(value) * (sizes[i] ?? 0), 0);
  const seen = new Map<number, readonly Frame[]>();
  return dimensions.map((dimension): DimensionTolerance => {
    const { face, direction, from: [start], to: [end] } = dimension;
    const frames = seen.get(face) ?? seenFrom(part, face);
    seen.set(face, frames);
    const nominal = start && end ? endPosition(frames, endPoint(part, end, null), direction, 1) - endPosition(frames, endPoint(part, start, null), direction, -1) : 0;
    const form = dimensionForm(part, steps, motions, lines, frames, dimension, worstOf);
    return { dimension, nominal: mm(nominal), ...toleranceOfForm(form, steps, repeats) };
  });
}
