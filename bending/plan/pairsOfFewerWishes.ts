import { searchLearning } from "../order/searchLearning";
import type { SearchLimits } from "../order/searchOrder";
import { createStepChecks } from "./createStepChecks";
import { createGaugeNumbers } from "./gaugeNumbers";
import { relaxedProblem } from "./relaxedProblem";
import type { Situation } from "./situation";
import type { ToolPair } from "./toolPair";

/** Pairs taken for a step: the likeliest of those that leave fewest wishes. */
const TAKEN = 2;

/**
 * Pairs with which some order, the bed left out, leaves fewer wishes unmet than `than`: for each of its steps the likeliest that can make it with the fewest.
 * Empty when none does, or when told to stop.
 */
export function pairsOfFewerWishes(situation: Situation, than: number, limits: Pick<SearchLimits, "shouldStop" | "onExpand">): readonly ToolPair[] {
  const checks = createStepChecks(situation);
  const { outcome } = searchLearning(relaxedProblem(situation, checks, createGaugeNumbers()), limits);
  if (outcome.kind !== "found" || outcome.demerits >= than) return [];
  const taken = outcome.steps.flatMap(({ move, formed }) => {
    const able = situation.pairs.filter(({ index }) => checks.possible(move, formed, index));
    const least = Math.min(...able.map(({ index }) => checks.wishes(move, index)));
    return able.filter(({ index }) => checks.wishes(move, index) === least).slice(0, TAKEN);
  });
  return [...new Set(taken)];
}
