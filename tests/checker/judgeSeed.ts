import type { Clearance } from "@/bending";
import { judgeScene } from "./judgeScene";
import type { Modeller } from "./modeller";
import { createRandom } from "./random";
import { scenesOf, type Answers, type Scene } from "./scene";
import { createStages } from "./stage";
import { addTo, type Finding, type Tally } from "./tally";
import { createToolShapes } from "./toolBars";

export interface Found {
  readonly seed: number;
  readonly index: number;
  readonly finding: Finding;
  readonly scene: Scene;
  readonly answers: Answers;
}

export interface SeedResult {
  readonly samples: number;
  /** Samples in which the product says no to something; in which it says yes to all; in which the solids come nearer than twice the margin, or the two differ within it. */
  readonly blocked: number;
  readonly allFree: number;
  readonly near: number;
  /** Places that the modeller looked at. */
  readonly modelled: number;
  readonly found: readonly Found[];
}

/** Judges all strokes of the part that a seed stands for, and counts. `told`: what takes the place of the product's answers, to see that the checker notices. */
export function createJudge(modeller: Modeller, told: (clearance: Clearance) => Clearance = (clearance) => clearance): (seed: number, tally: Tally) => SeedResult {
  const stages = createStages(modeller);
  const shapes = createToolShapes(modeller);
  return (seed, tally) => {
    const random = createRandom(seed);
    const found: Found[] = [];
    let [samples, blocked, near, modelled] = [0, 0, 0, 0];
    scenesOf(random).forEach((drawn, index) => {
      const scene = { ...drawn, clearance: told(drawn.clearance) };
      const stage = stages(scene);
      if (!stage) return;
      samples++;
      const { answers, verdicts, modelled: asked } = judgeScene({ modeller, scene, stage, random, fingerShape: shapes(scene.machine.gauge.fingerProfile), all: false });
      for (const { finding } of verdicts) if (finding) found.push({ seed, index, finding, scene, answers });
      addTo(tally, verdicts.map(({ question, outcome }) => [question, outcome]));
      const saysNo = (["met", "margin", "falseInfeasible", "choice"] as const);
      if (verdicts.some(({ outcome }) => saysNo.some((no) => no === outcome))) blocked++;
      if (verdicts.some(({ outcome }) => outcome === "near" || outcome === "margin")) near++;
      if (asked) modelled++;
    });
    return { samples, blocked, allFree: samples - blocked, near, modelled, found };
  };
}
