import type { PartModel } from "../part/partModel";
import { candidatePairs } from "../plan/candidatePairs";
import { createSituation } from "../plan/createSituation";
import { createStepChecks, type StepChecks } from "../plan/createStepChecks";
import { partVariants } from "../plan/partVariants";
import type { PlanReason } from "../plan/planDocument";
import type { PlanRequest } from "../plan/planRequest";
import type { Situation } from "../plan/situation";
import { createStrokeWorks } from "./createStrokeWorks";

/** One flat of the part with all pairs of tools that fit some bend; every order is free in it. */
export interface FlatGround {
  readonly situation: Situation;
  readonly checks: StepChecks;
  /** Can a move be made in a state, the bed left out? */
  readonly works: (move: number, formed: number) => boolean;
  /** The bits that stand for each drawn bend, where several strokes make one. */
  readonly bitsOf: readonly number[];
}

export interface Ground {
  /** The flats that a plan would look at, the likeliest first; each is worked out when it is asked for, and kept. */
  readonly flat: (index: number) => FlatGround | undefined;
  /** Why there are no tools to look at, of the flats asked for so far that have none. */
  readonly reasons: () => readonly PlanReason[];
  /** The likeliest flat; null when the part cannot be built. */
  readonly part: PartModel | null;
  /** The V that is looked for first, mm. */
  readonly wantedV: number;
}

/** What questions about orders of one part are asked of. */
export function createGround(request: PlanRequest): Ground {
  const { document, machine, tools, airForceFactor, wishes } = request;
  const variants = partVariants(request);
  const all = variants.ok ? variants.value : [];
  const flats: FlatGround[] = [];
  const reasons: PlanReason[] = [];
  let next = 0;
  const workOutNext = (): void => {
    const variant = all[next];
    next += 1;
    if (variant === undefined) return;
    const found = candidatePairs(tools, machine, variant.part.thickness, variant.wantedV, document.units);
    if (found.pairs.length === 0) {
      reasons.push(...found.reasons);
      return;
    }
    const situation = createSituation({ variant, machine, units: document.units, pairs: found.pairs, airForceFactor, wishes });
    const checks = createStepChecks(situation);
    flats.push({ situation, checks, works: createStrokeWorks(situation, checks), bitsOf: variant.bitsOf });
  };
  return {
    flat: (index) => {
      while (flats.length <= index && next < all.length) workOutNext();
      return flats[index];
    },
    reasons: () => reasons,
    part: all[0]?.part ?? null,
    wantedV: all[0]?.wantedV ?? 0,
  };
}
