import { mm } from "@/bending/core/units";
import { kFactorFromDeduction } from "@/bending/handbook/kFactorFromDeduction";
import { outsideSetback } from "@/bending/handbook/outsideSetback";
import { allowanceRules } from "../allowanceRules";
import { bendFigures } from "../bendFigures";
import { figures } from "../figures";
import type { Section } from "../section";

/** Deduction and K out of a test strip. */
export const measured: Section = {
  id: "measured",
  title: "K from a measured bend",
  question: "One strip bent once: which K has the shop's own tool and sheet?",
  fields: ["ma", "mb", "ml"], choices: [], needs: ["t", "a", "v", "r"],
  answer: (q) => {
    const { α, R, t } = bendFigures(q);
    const [a, b, L] = [q.number("ma"), q.number("mb"), q.number("ml")];
    const deduction = mm(a + b - L);
    const allowance = 2 * outsideSetback(q.angle, q.insideRadius, q.thickness) - deduction;
    const k = kFactorFromDeduction(deduction, q.angle, q.insideRadius, q.thickness);
    const rule = allowanceRules(q)[0];
    return [{
      answers: [
        { label: "Measured deduction BD", kind: "length", value: deduction, formula: { text: "BD = a + b − L", of: { a: figures.length(a), b: figures.length(b), L: figures.length(L) } }, source: "definition; legs outside, up to 90° to the apex, above to the outermost tangent", ...(rule ? { note: `${rule.title} gives another by the difference below.` } : {}) },
        { label: "Measured allowance BA", kind: "length", value: allowance, formula: { text: "BA = 2 · SB − BD", of: { SB: figures.length(outsideSetback(q.angle, q.insideRadius, q.thickness)), BD: figures.length(deduction) } }, source: "general sheet-metal texts" },
        { label: "K", kind: "ratio", value: k, formula: { text: "K = [BA · 180° / (π · α) − R | t]", of: { BA: figures.length(allowance), α, R, t } }, source: "the allowance formula turned round" },
        ...(rule ? [{ label: `Measured less ${rule.title}`, kind: "length", value: deduction - rule.deduction, formula: { text: "Δ = BD − BD_0", of: { BD: figures.length(deduction), BD_0: figures.length(rule.deduction) } }, source: rule.source } as const] : []),
      ],
      ...(k < 0.2 || k > 0.6 ? { remark: { tone: "caution", text: "Real sheets have a K between about 0.3 and 0.5. Measure legs, blank and inside radius again; a radius guessed wrong moves K most." } } : {}),
    }];
  },
};
