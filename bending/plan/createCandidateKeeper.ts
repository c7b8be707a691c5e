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

/** The best plans so far. */
export interface CandidateKeeper {
  readonly keep: (candidate: Candidate) => void;
  /** Best first. */
  readonly kept: () => readonly Candidate[];
  /** A plan of this weight or more is not worth looking for. */
  readonly worst: () => number;
}

/** Two weights nearer than this are equal. */
export const SAME_WEIGHT = 1e-7;

export function createCandidateKeeper(most: number): CandidateKeeper {
  const candidates: Candidate[] = [];
  return {
    keep: (candidate) => {
      if (candidates.some((one) => sameCandidate(one, candidate))) return;
      candidates.push(candidate);
      candidates.sort((a, b) => (Math.abs(a.weight - b.weight) < SAME_WEIGHT ? carried(a) - carried(b) : a.weight - b.weight));
      candidates.length = Math.min(candidates.length, most);
    },
    kept: () => [...candidates],
    worst: () => (candidates.length < most ? Infinity : (candidates[most - 1]?.weight ?? Infinity) - SAME_WEIGHT),
  };
}

/** Length of all tools on the bed: of plans that take the same time, the one with less to carry. */
const carried = ({ layout }: Candidate) => layout.stations.reduce((sum, { punch, die }) => sum + punch.length + die.length, 0);

/** Plans found twice: the same steps on stations of the same pairs and lengths. */
function sameCandidate(a: Candidate, b: Candidate): boolean {
  return Math.abs(a.weight - b.weight) < SAME_WEIGHT && print(a) === print(b);
}

const print = ({ steps, layout }: Candidate) => JSON.stringify([
  steps.map(({ move, station }) => [move, station]),
  layout.stations.map(({ pair, punch, die, z }) => [pair, punch.length, die.length, Math.round(z)]),
]);
