import { outsideSetback } from "@/bending/handbook/outsideSetback";
import { resolveAllowance } from "@/bending/handbook/resolveAllowance";
import type { AnswerGroup } from "../answer";
import { allowanceRules, type RuleAnswer } from "../allowanceRules";
import { bendFigures } from "../bendFigures";
import { figures } from "../figures";
import type { Question } from "../question";
import type { Section } from "../section";
import { setbackAnswer } from "../setback";

/** Bend allowance, deduction and K by every rule. */
export const allowance: Section = {
  id: "allowance",
  title: "Allowance, deduction and K",
  question: "What does one bend take of the flat, by each rule?",
  fields: ["k"], choices: ["rule"], needs: ["t", "a", "v", "r"],
  answer: (q) => {
    const byRule = allowanceRules(q);
    const deductions = byRule.map(({ deduction }) => deduction as number);
    return [
      { answers: [setbackAnswer(q)], ...(q.degrees > 90 ? { remark: { tone: "note", text: "Over 90° the legs are measured to the outermost tangent, as in part documents; American pages carry them on to the apex." } } : {}) },
      ...shopGroup(q),
      ...byRule.map((rule, i) => ruleGroup(rule, q, i === 0)),
      { title: "Between the rules", answers: [{ label: "Largest difference in the flat, one bend", kind: "length", value: Math.max(...deductions) - Math.min(...deductions), source: "highest less lowest deduction above; a measured bend of the shop's own settles it" }] },
    ];
  },
};

function ruleGroup(rule: RuleAnswer, q: Question, first: boolean): AnswerGroup {
  const { α, R, t } = bendFigures(q);
  const SB = figures.length(outsideSetback(q.angle, q.insideRadius, q.thickness));
  const BA = figures.length(rule.allowance);
  return {
    title: `${rule.title}${first ? (q.choices.rule === "material" ? `, the rule of ${q.material.id}` : ", as chosen") : ""}`,
    answers: [
      { label: "Bend allowance BA", kind: "length", value: rule.allowance, formula: rule.formula, source: rule.source },
      { label: "Bend deduction BD", kind: "length", value: rule.deduction, formula: { text: "BD = 2 · SB − BA", of: { SB, BA } }, source: "general sheet-metal texts" },
      { label: "K", kind: "ratio", value: rule.k, formula: { text: "K = [BA · 180° / (π · α) − R | t]", of: { BA, α, R, t } }, source: "where the neutral line lies, as a part of the thickness from inside" },
    ],
  };
}

/** What the shop has measured near this bend, before every rule; nothing where it has no trial near enough. */
function shopGroup(q: Question): readonly AnswerGroup[] {
  if (q.shopTable === null) return [];
  const { material, thickness, insideRadius, angle, vOpening } = q;
  const { basis, allowance: BA, deduction, k } = resolveAllowance({ rule: "shop", material, thickness, insideRadius, angle, shop: { table: q.shopTable, vOpening, openingFrom: Number.isNaN(q.number("v")) ? "usual" : "die" } });
  if (basis.shop === null) return [];
  return [{
    title: "The shop's own trials, which go before every rule",
    answers: [
      { label: "Bend deduction BD", kind: "length", value: deduction, source: basis.text },
      { label: "Bend allowance BA", kind: "length", value: BA, formula: { text: "BA = 2 · SB − BD", of: { SB: figures.length(outsideSetback(angle, insideRadius, thickness)), BD: figures.length(deduction) } }, source: basis.text },
      { label: "K", kind: "ratio", value: k, source: basis.text },
    ],
  }];
}
