import { expect } from "vitest";
import { caseOf } from "./caseOf";
import { createJudge } from "./judgeSeed";
import { createModeller } from "./modeller";
import { countOf, emptyTally, QUESTIONS } from "./tally";

/** The parts of the seeds from `first` on, until there are so many samples: nothing is falsely called feasible, next to nothing falsely infeasible, and the samples are worth looking at. */
export async function checkSeeds(first: number, samples: number): Promise<void> {
  const judge = createJudge(await createModeller());
  const tally = emptyTally();
  const total = { samples: 0, blocked: 0, allFree: 0, near: 0, modelled: 0 };
  for (let seed = first; total.samples < samples; seed++) {
    const { found, ...counts } = judge(seed, tally);
    for (const key of ["samples", "blocked", "allFree", "near", "modelled"] as const) total[key] += counts[key];
    expect(found.filter(({ finding }) => finding.outcome === "falseFeasible").map((one) => JSON.stringify(caseOf(one)))).toEqual([]);
  }
  expect(countOf(tally, "falseInfeasible") + countOf(tally, "choice"), JSON.stringify(tally)).toBeLessThan(total.samples / 200);
  for (const share of [total.blocked, total.allFree, total.near, total.modelled]) expect(share, JSON.stringify(total)).toBeGreaterThan(total.samples / 10);
  for (const question of QUESTIONS) expect(tally[question].clear + tally[question].near, question).toBeGreaterThan(samples / 20);
  for (const question of ["punch", "die", "other", "ram", "bed"] as const) expect(tally[question].met, question).toBeGreaterThan(samples / 50);
  for (const question of ["self", "way"] as const) expect(tally[question].met, question).toBeGreaterThan(samples / 200);
}
