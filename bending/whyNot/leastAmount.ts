import type { PlanDocument } from "../plan/planDocument";
import type { Attempts, Change } from "./createAttempts";

export interface AmountQuestion {
  readonly attempts: Attempts;
  /** The amount as it is, or the end of what makes sense. */
  readonly from: number;
  /** Is this what the request has, so that it is known to give no plan where that was proven? */
  readonly asItIs: boolean;
  /** Amounts to try in turn, each farther from it than the one before. */
  readonly ladder: readonly number[];
  /** What the answer is known to; amounts are whole multiples of it. */
  readonly resolution: number;
  /** Null where the amount makes no sense. */
  readonly change: (amount: number) => Change | null;
}

export interface LeastAmount {
  readonly value: number;
  readonly change: Change;
  readonly plan: PlanDocument;
  /** The nearest amount on the side of `from` that is proven to give no plan. */
  readonly notEnough?: number;
}

/** The amount nearest to `from` that gives a plan: up the ladder to the first that does, then halving; null when none does. */
export function leastAmount({ attempts, from, asItIs, ladder, resolution, change }: AmountQuestion): LeastAmount | null {
  let bad = { value: from, proven: asItIs && attempts.impossible };
  const ask = (value: number): LeastAmount | null => {
    const changed = change(value);
    const attempt = changed === null ? null : attempts.first(changed);
    if (changed !== null && attempt?.kind === "works") return { value, change: changed, plan: attempt.plan };
    bad = { value, proven: attempt?.kind === "fails" };
    return null;
  };
  let found: LeastAmount | null = null;
  for (const value of ladder) {
    if (attempts.ended()) return null;
    found = ask(value);
    if (found) break;
  }
  while (found && apart(found.value, bad.value) > resolution && !attempts.ended()) found = ask(between(found.value, bad.value, resolution)) ?? found;
  return found && bad.proven && apart(found.value, bad.value) <= resolution ? { ...found, notEnough: bad.value } : found;
}

/** Rounding noise of a difference of two amounts is taken off. */
const apart = (a: number, b: number) => Math.abs(a - b) - 1e-9;

/** A whole multiple of the resolution strictly between the two, as near to the middle as can be; `good` is one itself. */
function between(good: number, bad: number, resolution: number): number {
  const middle = Math.round((good + bad) / 2 / resolution) * resolution;
  const strictly = Math.min(Math.abs(middle - good), Math.abs(middle - bad)) > resolution * 1e-6;
  return Number((strictly ? middle : good + Math.sign(bad - good) * resolution).toFixed(6));
}
