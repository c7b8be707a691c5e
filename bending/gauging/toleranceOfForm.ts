import { SAME_POINT_MM } from "../core/tolerance";
import { mm } from "../core/units";
import type { DimensionTolerance, StepShare } from "./dimensionTolerance";
import type { GaugedStep, Repeats } from "./gaugedStep";
import { angleEntry, gaugeEntry, type LinearForm } from "./linearForm";

/** Standard uncertainty of what lies anywhere within plus and minus 1: 1 / sqrt 3 (JCGM 100:2008, 4.3.7). */
const RECTANGULAR = 1 / Math.sqrt(3);
/** Coverage factor for about 95 % (JCGM 100:2008, 6.3.3). */
const COVERAGE = 2;

/**
 * What a sum over the steps' errors comes to. Worst case: the sum of all shares. Statistical: every repeat is a rectangular
 * distribution over its plus and minus, the errors are independent, so their standard uncertainties add as squares
 * (JCGM 100:2008, 5.1.2), times 2 for about 95 %; never more than the worst case, which a single share would be outdone by.
 */
export function toleranceOfForm(form: LinearForm, steps: readonly GaugedStep[], repeats: Repeats): Omit<DimensionTolerance, "dimension" | "nominal"> {
  const shares = steps.flatMap(({ touch }, step): readonly (StepShare & { readonly held: boolean })[] => {
    const gauge = Math.abs(form[gaugeEntry(step)] ?? 0);
    const angle = Math.abs(form[angleEntry(step)] ?? 0) * repeats.angle;
    const free = touch === null && gauge > SAME_POINT_MM;
    const held = gauge * repeats.gauge;
    return free || held > SAME_POINT_MM || angle > SAME_POINT_MM ? [{ step, gauge: mm(held), angle: mm(angle), held: !free }] : [];
  });
  const worst = shares.reduce((sum, { gauge, angle }) => sum + gauge + angle, 0);
  const uncertainty = RECTANGULAR * Math.hypot(...shares.flatMap(({ gauge, angle }) => [gauge, angle]));
  const bounded = shares.every(({ held }) => held);
  return {
    worstCase: bounded ? mm(worst) : null,
    statistical: bounded ? mm(Math.min(worst, COVERAGE * uncertainty)) : null,
    shares: shares.map(({ step, gauge, angle }) => ({ step, gauge, angle })),
  };
}
