import { vOpeningChart, type VOpeningChart } from "@/bending/handbook/vOpeningChart";
import { vOpeningForMethod } from "@/bending/handbook/vOpeningForMethod";
import type { Answer } from "../answer";
import { figures } from "../figures";
import type { Question } from "../question";
import type { Section } from "../section";

const charts: readonly (readonly [VOpeningChart, string, string])[] = [
  ["metric", "Usual V, metric chart", "trade chart: 6 t to 2.6 mm, 8 t to 8 mm, 10 t to 12 mm, then 12 t; the planner's rule"],
  ["inch", "Usual V, inch chart", "trade chart in inches: 6 t to .105, 8 t to .313, 10 t to .500, then 12 t"],
  ["second", "Usual V, another chart", "second trade chart: 6 t to 2.5 mm, 8 t to 8 mm, 10 t to 10 mm, 12 t over 12 mm"],
];

/** Which V for a thickness. */
export const vOpening: Section = {
  id: "v", title: "V opening for a thickness", question: "Which V does this sheet usually go over?", fields: [], choices: [], needs: ["t"],
  answer: (q) => [
    { answers: charts.map(([chart, label, source]) => byChart(q, chart, label, source)) },
    { title: "Other methods", answers: [method(q, "coining", "Coining"), method(q, "partial", "Partial bending, sheet free of the V's faces")] },
  ],
};

function byChart(q: Question, chart: VOpeningChart, label: string, source: string): Answer {
  const found = vOpeningChart(q.thickness, chart);
  return {
    label, kind: "length", value: found.vOpening, source, formula: { text: "V = n · t", of: { n: figures.count(found.times), t: figures.length(q.thickness) } },
    ...(found.betweenRows ? { note: "The chart has no row for this thickness; its next thicker one is used." } : {}),
  };
}

function method(q: Question, name: "coining" | "partial", label: string): Answer {
  const [low, high] = vOpeningForMethod(q.thickness, name);
  const of = { n: figures.count(Math.round(low / q.thickness)), t: figures.length(q.thickness) };
  return { label, kind: "length", value: low, ...(high > low ? { upTo: high } : {}), formula: { text: "V = n · t", of }, source: "trade chart" };
}
