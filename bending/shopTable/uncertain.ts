import type { BudgetLine, Uncertain } from "./trialResult";

/** Coverage factor: about 95 % for a distribution near to normal (JCGM 100:2008, 6.3.3). */
export const COVERAGE = 2;

/** A value with its standard uncertainty, the root of the sum of squares of the shares (JCGM 100:2008, equation 10), and the expanded one. */
export function uncertain(value: number, budget: readonly BudgetLine[], on: "onDeduction" | "onAllowance" | "onK"): Uncertain {
  const standard = Math.sqrt(budget.reduce((sum, line) => sum + (line[on] * line.standard) ** 2, 0));
  return { value, standard, expanded: COVERAGE * standard };
}
