import type { Interval } from "@/bending";
import { farthestForbidden } from "./limits";
import type { Random } from "./random";
import type { Answers, Scene } from "./scene";
import type { Stage } from "./stage";
import type { Finding, Outcome } from "./tally";
import { wayIsClear, WAYS, type Standing } from "./wayContact";

/** Where along the bend line tools are tried when the product says that there is no way: all of it, and a quarter. */
const windows = ([from, to]: Interval, random: Random): readonly Interval[] => {
  const start = random.number(from, to - (to - from) / 4);
  return [[from, to], [start, start + (to - from) / 4]];
};

/** Getting the flat part in and the formed part out, with every tool that the product lets stand. */
export function judgeWays(scene: Scene, stage: Stage, answers: Answers, random: Random): { readonly outcome: Outcome; readonly finding: Finding | null } {
  const { machine: { settings: { clearance: margin } }, punch, die } = scene;
  const trapped = answers.blocked.filter(({ kind }) => kind === "trapped").map(({ strokeAngle }) => strokeAngle);
  const far = farthestForbidden(margin);
  const machine: readonly Standing[] = [{ thing: stage.ram, makes: true }, { thing: stage.bed, makes: true }];
  const moments = [0, stage.motion.angles.length - 1];
  const finding = (outcome: Finding["outcome"], say: string, moment: number): Finding => ({ question: "way", outcome, say, angle: stage.motion.angles[moment] ?? 0 });
  const makes = (tool: unknown) => tool === punch || tool === die;
  let said = 0;
  for (const moment of moments) {
    const angle = stage.motion.angles[moment] ?? 0;
    const rest = stage.restAt(moment);
    if (trapped.some((at) => Math.abs(at - angle) < 1e-9)) {
      said++;
      for (const at of windows(stage.line, random)) {
        const tools = [punch, die].map((tool): Standing => ({ thing: stage.thing(tool, at), makes: true }));
        const way = WAYS.find((one) => wayIsClear(one, rest, [...machine, ...tools], margin, far));
        if (way) return { outcome: "falseInfeasible", finding: finding("falseInfeasible", `${way} is clear with tools at ${at.map((z) => z.toFixed(2)).join(" to ")}`, moment) };
      }
      continue;
    }
    const standing = [...machine, ...answers.standing.filter(({ free }) => free).map(({ tool, at }): Standing => ({ thing: stage.thing(tool, at), makes: makes(tool) }))];
    if (!WAYS.some((one) => wayIsClear(one, rest, standing, margin, 0))) return { outcome: "falseFeasible", finding: finding("falseFeasible", "no straight way is clear of what may stand", moment) };
  }
  return { outcome: said > 0 ? "met" : "clear", finding: null };
}

/** A tool that is forbidden but clear of the stroke: is there a way past it with the makers on the line, by more than the bounds? */
export function clearOfWays(scene: Scene, stage: Stage, answers: Answers, index: number): boolean {
  const { machine: { settings: { clearance: margin } }, punch, die } = scene;
  const far = farthestForbidden(margin);
  const asked = answers.standing[index];
  if (!asked) return false;
  const standing: Standing[] = [{ thing: stage.ram, makes: true }, { thing: stage.bed, makes: true }];
  for (const { tool, at } of [asked, ...answers.standing.filter(({ tool, free }) => free && (tool === punch || tool === die))]) standing.push({ thing: stage.thing(tool, at), makes: tool === punch || tool === die });
  return [0, stage.motion.angles.length - 1].every((moment) => WAYS.some((one) => wayIsClear(one, stage.restAt(moment), standing, margin, far)));
}
