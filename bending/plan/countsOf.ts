import { stepSeconds } from "../order/stepSeconds";
import type { MachineTimes } from "../tooling/machine";
import type { Candidate } from "./createCandidateKeeper";
import type { StepChecks } from "./createStepChecks";
import { createGaugeNumbers } from "./gaugeNumbers";
import { layoutProblem } from "./layoutProblem";
import type { PlanCounts } from "./planCounts";
import { rounded } from "./rounded";
import { setupSeconds } from "./setupSeconds";
import type { Situation } from "./situation";

const FREE: MachineTimes = { flip: 0, turn: 0, walkPerMetre: 0, stroke: 0, gaugeMove: 0, stationSetup: 0, sectionPlace: 0 };

/** How often a plan pays each time setting: what it costs when that one takes a second and the others none. */
export function countsOf(situation: Situation, checks: StepChecks, { layout, steps }: Pick<Candidate, "layout" | "steps">): PlanCounts {
  const numbers = createGaugeNumbers();
  const pieces = layout.stations.reduce((sum, { punch, die }) => sum + punch.pieces.length + die.pieces.length, 0);
  const count = (setting: keyof MachineTimes): number => {
    const machine = { ...situation.machine, times: { ...FREE, [setting]: 1 } };
    const problem = layoutProblem({ ...situation, machine }, checks, numbers, layout);
    const taken = steps.map(({ move, station, formed }) => ({ move, station, gauge: problem.option(move, formed, station)?.gauge ?? 0 }));
    const ofOne = taken.reduce((sum, step, index) => sum + stepSeconds(problem, taken[index - 1] ?? null, step), 0);
    return rounded(setupSeconds(machine, layout.stations.length, pieces) + ofOne);
  };
  return {
    flips: count("flip"), turns: count("turn"), metres: count("walkPerMetre"), strokes: count("stroke"), gaugeMoves: count("gaugeMove"),
    stations: count("stationSetup"), pieces: count("sectionPlace"),
  };
}
