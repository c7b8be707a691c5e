import { mm } from "../core/units";
import type { PartModel } from "../part/partModel";
import { dimensionSizes } from "./dimensionSizes";
import type { DimensionTolerance } from "./dimensionTolerance";
import type { GaugedStep, Repeats } from "./gaugedStep";
import { sizeForms } from "./sizeForms";
import type { PartDimension } from "./partDimension";
import { toleranceOfForm } from "./toleranceOfForm";

/**
 * The tolerance that adds up: for every dimension how far it may miss when the part is bent in these steps, each from
 * what its fingers touch. Of several places where a dimension may be measured the worst one is told.
 */
export function partTolerances(part: PartModel, steps: readonly GaugedStep[], repeats: Repeats, dimensions: readonly PartDimension[]): readonly DimensionTolerance[] {
  const nominal = dimensionSizes(part, part, dimensions);
  const forms = sizeForms(part, steps, dimensions);
  return dimensions.map((dimension, i): DimensionTolerance => {
    const all = (forms[i] ?? []).map((form) => toleranceOfForm(form, steps, repeats));
    const [first, ...rest] = all;
    const worst = rest.reduce((most, one) => ((one.worstCase ?? Infinity) > (most?.worstCase ?? Infinity) ? one : most), first);
    return { dimension, nominal: mm(nominal[i]?.[0] ?? 0), worstCase: worst?.worstCase ?? null, statistical: worst?.statistical ?? null, shares: worst?.shares ?? [] };
  });
}
