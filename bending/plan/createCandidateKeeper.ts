import type { OrderStep } from "../order/orderProblem";
import type { Layout } from "../setup/layout";

export interface Candidate {
  readonly layout: Layout;
  readonly steps: readonly OrderStep[];
  readonly perPart: number;
  readonly demerits: number;
  /** Setup and batch in seconds, demerits weighed in. */
  readonly weight: number;
}

/** The best plans so far, each really different from the others. */
export interface CandidateKeeper {
  readonly keep: (candidate: Candidate) => void;
  /** Best first. */
  readonly kept: () => readonly Candidate[];
  /** A plan of this weight or more is not worth looking for. */
  readonly worst: () => number;
}

/** Two weights nearer than this are equal. */
export const SAME_WEIGHT = 1e-7;

/** Keeps the best plan of each class; two plans of one class differ in nothing that a person would choose by. */
export function createCandidateKeeper(most: number, classOf: (candidate: Candidate) => string): CandidateKeeper {
  const candidates: { readonly plan: Candidate; readonly of: string }[] = [];
  return {
    keep: (plan) => {
      const of = classOf(plan);
      const alike = candidates.findIndex((one) => one.of === of);
      if (alike >= 0) {
        if (inOrder(candidates[alike]?.plan ?? plan, plan) <= 0) return;
        candidates.splice(alike, 1);
      }
      candidates.push({ plan, of });
      candidates.sort((a, b) => inOrder(a.plan, b.plan));
      candidates.length = Math.min(candidates.length, most);
    },
    kept: () => candidates.map(({ plan }) => plan),
    worst: () => (candidates.length < most ? Infinity : (candidates[most - 1]?.plan.weight ?? Infinity) - SAME_WEIGHT),
  };
}

const inOrder = (a: Candidate, b: Candidate): number => (Math.abs(a.weight - b.weight) < SAME_WEIGHT ? carried(a) - carried(b) : a.weight - b.weight);

/** Length of all tools on the bed: of plans that take the same time, the one with less to carry. */
const carried = ({ layout }: Candidate) => layout.stations.reduce((sum, { punch, die }) => sum + punch.length + die.length, 0);
