/**
 * The long run: as many random samples as one likes.
 *
 *     npx tsx tests/checker/longRun.ts FROM SAMPLES
 *
 * takes the parts of the seeds FROM, FROM + 1, ... (up to 48 samples each) until SAMPLES have been judged. Every 5,000 samples it prints a line of
 * JSON with the next seed and all counts since FROM; a run that was stopped goes on from that seed. Runs from seeds far apart (1, 1,000,000, ...)
 * can stand side by side, one process each. Whatever differs is printed as a case that can be put into tests/checker/cases.
 * Exit code 1 when something was falsely called feasible, or the checker's own two ways of measuring differ.
 */
import { caseOf } from "./caseOf";
import { createJudge, type SeedResult } from "./judgeSeed";
import { createModeller } from "./modeller";
import { countOf, emptyTally } from "./tally";

const PRINT_EVERY = 5000;

async function run(from: number, wanted: number): Promise<void> {
  const judge = createJudge(await createModeller());
  const tally = emptyTally();
  const total = { samples: 0, blocked: 0, allFree: 0, near: 0, modelled: 0 };
  const print = (next: number) => console.log(JSON.stringify({
    next, ...total, falseFeasible: countOf(tally, "falseFeasible"), falseInfeasible: countOf(tally, "falseInfeasible"), choice: countOf(tally, "choice"), tally,
    cpuSeconds: Math.round((process.cpuUsage().user + process.cpuUsage().system) / 1e6),
  }));
  /** What the checker itself stumbles over is said, and the run goes on. */
  const judgeOrSay = (which: number): SeedResult => {
    try {
      return judge(which, tally);
    } catch (error) {
      faults++;
      console.log(JSON.stringify({ fault: String(error), seed: which }));
      return { samples: 0, blocked: 0, allFree: 0, near: 0, modelled: 0, found: [] };
    }
  };
  let faults = 0;
  let printed = 0;
  let seed = from;
  while (total.samples < wanted) {
    const { found, ...counts } = judgeOrSay(seed++);
    for (const key of ["samples", "blocked", "allFree", "near", "modelled"] as const) total[key] += counts[key];
    for (const one of found) console.log(JSON.stringify({ finding: one.finding, case: caseOf(one) }));
    if (total.samples - printed < PRINT_EVERY && total.samples < wanted) continue;
    printed = total.samples;
    print(seed);
  }
  process.exitCode = countOf(tally, "falseFeasible") + faults > 0 ? 1 : 0;
}

const [from, wanted] = process.argv.slice(2).map(Number);
if (from === undefined || wanted === undefined || !(from >= 0) || !(wanted > 0)) {
  console.error("usage: npx tsx tests/checker/longRun.ts FROM SAMPLES");
  process.exitCode = 2;
} else void run(from, wanted);
