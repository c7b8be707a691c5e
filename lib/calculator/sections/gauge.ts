import { gaugeForThickness } from "@/bending/handbook/gaugeForThickness";
import { gaugeThickness, type GaugeSystem } from "@/bending/handbook/gaugeThickness";
import { formatQuantity } from "@/lib/format/formatQuantity";
import type { Question } from "../question";
import type { Section } from "../section";

const systems: readonly (readonly [GaugeSystem, string, string])[] = [
  ["steel", "Steel", "manufacturers' standard gauge: US Standard x 40 / 41.82, printed with four decimals of an inch"],
  ["stainless", "Stainless steel", "US Standard Gauge, the law's fraction of an inch"],
  ["aluminium", "Aluminium", "wire gauge (ASTM B258): 0.005 in x 92^((36 - g) / 39), printed with four decimals of an inch"],
];

/** Gauge numbers both ways. */
export const gauge: Section = {
  id: "gauge", title: "Sheet gauge and thickness", question: "How thick is a gauge, and which gauge is a thickness?", fields: ["g"], choices: [], needs: ["t"],
  answer: (q) => [
    { title: `Gauge ${q.number("g")} is`, answers: systems.map(([system, label, source]) => ({ label, kind: "length", value: gaugeThickness(q.number("g"), system) ?? NaN, source })) },
    { title: `The gauge nearest to ${formatQuantity(q.thickness, "length", q.choices.u)}`, answers: systems.flatMap((row) => nearest(q, row)), remark: { tone: "note", text: "The same number is another thickness in each metal, and a gauge is nominal: measure the sheet." } },
  ],
};

function nearest(q: Question, [system, label, source]: (typeof systems)[number]) {
  const found = gaugeForThickness(q.thickness, system);
  if (found === null) return [];
  const off = formatQuantity(Math.abs(found.deviation), "length", q.choices.u);
  return [{ label, kind: "count", value: found.gauge, source, note: `Nominal ${formatQuantity(found.nominal, "length", q.choices.u)}; this sheet is ${off} ${found.deviation < 0 ? "thinner" : "thicker"}.` } as const];
}
