import { toDeg } from "@/bending/core/units";
import { bendUnderLoad } from "@/bending/handbook/bendUnderLoad";
import { springback } from "@/bending/handbook/springback";
import { springbackFactor } from "@/bending/handbook/springbackFactor";
import { springbackRatio } from "@/bending/handbook/springbackRatio";
import type { AnswerGroup } from "../answer";
import { bendFigures } from "../bendFigures";
import { figures } from "../figures";
import type { Question } from "../question";
import type { Section } from "../section";

/** The angle that the stroke has to reach. */
export const demanded: Section = {
  id: "springback", title: "Springback and demanded angle", question: "How far must the stroke bend so that the angle is left?", fields: ["re"], choices: ["kr"], needs: ["t", "a", "v", "r"],
  answer: (q) => [elastic(q), table(q)],
};

function elastic(q: Question): AnswerGroup {
  const { α, R, t } = bendFigures(q);
  const before = springback(q.angle, q.insideRadius, q.thickness, q.material);
  const ratio = springbackRatio(before.radius, q.thickness, q.material);
  const title = "By elastic recovery";
  if (ratio === null) return { title, answers: [], remark: { tone: "caution", text: "A radius this large stays elastic: the sheet springs back flat. Type a smaller inside radius." } };
  const R_i = figures.length(before.radius);
  return {
    title,
    answers: [
      { label: "Inside radius under load", kind: "length", value: before.radius, formula: { text: "R_i = R · (4 · x³ − 3 · x + 1)", of: { R, x: figures.ratio((before.radius * q.material.yield) / (q.material.modulus * q.thickness)) } }, source: "Gardiner, Trans. ASME 79, 1957", note: "x = R_i Y / (E t), so the formula is solved by halving." },
      { label: "Springback factor K_s", kind: "ratio", value: ratio.angleRatio, formula: { text: "K_s = [2 · R_i / t + 1 | 2 · R / t + 1]", of: { R_i, R, t } }, source: "general forming texts; the German tables' k_R" },
      { label: "Demanded angle, turned through", kind: "angle", value: toDeg(before.angle), formula: { text: "α_1 = [α | K_s]", of: { α, K_s: figures.ratio(ratio.angleRatio) } }, source: "ideal elastic-plastic bending; hardening and the die's contact left out" },
    ],
  };
}

function table(q: Question): AnswerGroup {
  const { α, R, t } = bendFigures(q);
  const found = springbackFactor(q.choices.kr, q.insideRadius / q.thickness);
  const title = `By the table of k_R, ${q.choices.kr}`;
  if (found === null) return { title, answers: [], remark: { tone: "note", text: "The printed table goes from a radius of 1 thickness to 100 (stainless 40)." } };
  const made = bendUnderLoad({ angle: q.angle, radius: q.insideRadius }, q.thickness, found.factor);
  const k_R = figures.ratio(found.factor);
  return {
    title,
    answers: [
      { label: "Demanded angle, turned through", kind: "angle", value: toDeg(made.angle), formula: { text: "α_1 = [α | k_R]", of: { α, k_R } }, source: found.source, ...(found.interpolated ? { note: "Between two columns of the table: straight in the logarithm, common practice." } : {}) },
      { label: "Inside radius under load", kind: "length", value: made.radius, formula: { text: "R_1 = k_R · (R + [t | 2]) − [t | 2]", of: { k_R, R, t } }, source: "German metal-trades table book" },
    ],
  };
}
