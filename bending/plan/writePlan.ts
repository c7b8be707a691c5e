import { mmPer } from "../core/units";
import { cautionsOf } from "./cautionsOf";
import { countsOf } from "./countsOf";
import type { StepChecks } from "./createStepChecks";
import { drawnReason, drawnStep } from "./drawnPlan";
import { PLAN_ENGINE } from "./emptyPlan";
import { gaugedSteps } from "./gaugedSteps";
import { planFlat } from "./planFlat";
import type { PlanDocument, PlanFlat } from "./planDocument";
import { planTolerances } from "./planTolerances";
import { rounded } from "./rounded";
import type { Situation } from "./situation";
import type { Candidate } from "./createCandidateKeeper";
import { slantedEdgeCautions } from "./slantedEdgeCautions";
import { toleranceCautions } from "./toleranceCautions";
import { writeStation } from "./writeStation";
import { writeStep } from "./writeStep";

export interface PlanFrame {
  readonly batch: number;
  readonly expanded: number;
  readonly method: string;
  /** Seconds that no plan considered goes below. */
  readonly bound: number;
  readonly flatLength: (flat: PlanFlat) => number;
}

/** A candidate as a plan document, optimal when its total is the bound. */
export function writePlan(situation: Situation, checks: StepChecks, candidate: Candidate, frame: PlanFrame): PlanDocument {
  const { layout, steps } = candidate;
  const { part, drawn, splits, machine, units } = situation;
  const struck = steps.map((step, index) => writeStep(situation, checks, layout, step, steps[index - 1] ?? null));
  const written = splits.length === 0 ? struck : struck.map((step) => drawnStep(step, drawn, part));
  const flat = planFlat(drawn, units);
  const seconds = { setup: rounded(layout.setupSeconds), perPart: rounded(candidate.perPart), total: rounded(layout.setupSeconds + candidate.perPart * frame.batch) };
  const bound = Math.min(seconds.total, rounded(frame.bound));
  const gap = seconds.total - bound < 1e-6 ? 0 : rounded((seconds.total - bound) / seconds.total);
  const tolerances = planTolerances(situation, gaugedSteps(situation, checks, layout, steps));
  return {
    format: "plan/1",
    engine: PLAN_ENGINE,
    units,
    part: part.name,
    machine: machine.name,
    batch: frame.batch,
    status: gap === 0 ? "optimal" : "feasible",
    gap,
    flat,
    flatLength: frame.flatLength(flat),
    ...(splits.length === 0 ? {} : { splits: splits.map(({ bend, hits, allowance }) => ({ bend, hits, allowance: rounded(allowance / mmPer(units)) })) }),
    steps: written,
    order: written.map((step) => step.bends.join("+")),
    stations: layout.stations.map((station, index) => writeStation(situation, station, index)),
    seconds,
    counts: countsOf(situation, checks, candidate),
    cost: seconds.total,
    proof: { method: frame.method, expanded: frame.expanded, bound },
    reasons: [],
    cautions: [...cautionsOf(situation, layout, steps, struck).map(drawnReason), ...slantedEdgeCautions(written), ...toleranceCautions(tolerances, written.map(({ bends }) => bends), machine.settings.gaugeRepeat / mmPer(units), units)],
    tolerances,
    elapsedMs: 0,
  };
}
