import { allowanceRules } from "../allowanceRules";
import { figures } from "../figures";
import type { Section } from "../section";

/** Flat length of a part whose bends are all alike. */
export const flat: Section = {
  id: "flat",
  title: "Flat length",
  question: "How long is the blank of a part with equal bends?",
  fields: ["legs", "n"], choices: [], needs: ["t", "a", "v", "r", "k"],
  answer: (q) => {
    const [legs, n] = [q.number("legs"), q.number("n")];
    return [{
      answers: allowanceRules(q).map((rule) => ({
        label: `Flat length, ${rule.title}`, kind: "length", value: legs - n * rule.deduction,
        formula: { text: "L = Σ − n · BD", of: { Σ: figures.length(legs), n: figures.count(n), BD: figures.length(rule.deduction) } }, source: rule.source,
      })),
      ...(allowanceRules(q).some(({ deduction }) => legs <= n * deduction) ? { remark: { tone: "caution", text: "The bends take more than the legs are long: no such part." } } : {}),
    }];
  },
};
