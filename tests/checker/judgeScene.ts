import type { Interval } from "@/bending";
import { judgeFinger } from "./judgeFinger";
import { judgeSelf } from "./judgeSelf";
import { judgeTools, type Verdict } from "./judgeTools";
import { clearOfWays, judgeWays } from "./judgeWays";
import type { Modeller } from "./modeller";
import type { Random } from "./random";
import { answersTo, type Answers, type Scene } from "./scene";
import { solidsMeet } from "./solidsMeet";
import type { Stage } from "./stage";
import type { Finding, Outcome, Question } from "./tally";
import type { ToolShape } from "./toolBars";

export interface SceneQuestion {
  readonly modeller: Modeller;
  readonly scene: Scene;
  readonly stage: Stage;
  readonly random: Random;
  readonly fingerShape: ToolShape;
  /** Where the tools stand; drawn when absent. */
  readonly places?: readonly Interval[];
  /** Every question, not a share of them. */
  readonly all: boolean;
}

export interface SceneResult {
  readonly answers: Answers;
  readonly verdicts: readonly { readonly question: Question; readonly outcome: Outcome; readonly finding: Finding | null }[];
  readonly modelled: boolean;
}

/** Shares of the samples in which the part is judged against itself, the ways in and out (less often where there are said to be none), a gauge finger; and of which the closest place goes to the modeller. */
const SHARES = { self: 0.5, way: 0.9, trapped: 0.3, finger: 0.1, modelled: 0.2 } as const;

/** One sample: tools, ram and bed in the stroke, and some of the further questions. */
export function judgeScene({ modeller, scene, stage, random, fingerShape, places, all }: SceneQuestion): SceneResult {
  const answers = answersTo(scene, random, stage.line, stage.extent, places);
  const tools = judgeTools(scene, stage, answers).map((verdict, i) => chosen(verdict, scene, stage, answers, i));
  const asked = (share: number) => random.chance(share) || all;
  const rest = [
    ["self", asked(SHARES.self) ? judgeSelf(scene, stage, answers) : null],
    ["way", asked(answers.blocked.some(({ kind }) => kind === "trapped") ? SHARES.trapped : SHARES.way) ? judgeWays(scene, stage, answers, random) : null],
    ["finger", asked(SHARES.finger) ? judgeFinger(scene, stage, random, fingerShape) : null],
  ] as const;
  return {
    answers,
    verdicts: [...tools.map(({ question, outcome, finding }) => ({ question, outcome, finding })), ...rest.flatMap(([question, said]) => (said ? [{ question, ...said }] : []))],
    modelled: asked(SHARES.modelled) && askModeller(modeller, scene, stage, tools),
  };
}

/** A tool that is forbidden for the way that was taken in or out is told apart from one that is forbidden for the stroke. */
function chosen(verdict: Verdict, scene: Scene, stage: Stage, answers: Answers, index: number): Verdict {
  if (verdict.outcome !== "falseInfeasible" || index >= answers.standing.length) return verdict;
  if (!clearOfWays(scene, stage, answers, index)) return { ...verdict, outcome: "margin", finding: null };
  return verdict.finding ? { ...verdict, outcome: "choice", finding: { ...verdict.finding, outcome: "choice" } } : verdict;
}

/** mm3. What only just touches may go either way. */
const TRACE = 1e-3;

/** The place of the sample where the question is closest goes to the solid modeller, which must say the same. */
function askModeller(modeller: Modeller, scene: Scene, stage: Stage, tools: readonly Verdict[]): boolean {
  const closest = tools.flatMap(({ closest: one }) => (one && one.contact.distance < 5 ? [one] : [])).sort((a, b) => a.contact.distance - b.contact.distance);
  const one = closest.find(({ meets }) => !meets) ?? closest[0];
  if (!one) return false;
  const volume = solidsMeet(modeller, scene, stage, one.thing, one.contact.body, one.contact.moment);
  if (volume > TRACE && !one.meets) throw new Error(`the modeller finds ${volume} mm3 of ${one.contact.body.name} in ${one.thing.name}, taken to be ${one.contact.distance} mm off`);
  return true;
}
