import type { GaugedStep } from "../gauging/gaugedStep";
import { touchOf } from "../gauging/touchOf";
import type { OrderStep } from "../order/orderProblem";
import { fingerHeight } from "../setup/fingerHeight";
import type { Layout } from "../setup/layout";
import type { StepChecks } from "./createStepChecks";
import { placeStep } from "./placeStep";
import type { Situation } from "./situation";

/** The steps of a plan as far as their errors go. */
export function gaugedSteps(situation: Situation, checks: StepChecks, layout: Layout, steps: readonly OrderStep[]): readonly GaugedStep[] {
  const height = fingerHeight(situation.machine.gauge);
  return steps.map((step): GaugedStep => {
    const hit = checks.hitOf(step.move, step.formed);
    const gauge = placeStep(situation, checks, layout, step)?.gauge ?? null;
    return { ...hit, touch: gauge === null || gauge.fingers.length === 0 ? null : touchOf(situation.part, hit, gauge.option, height) };
  });
}
