import { buildPart } from "../part/buildPart";
import { candidatePairs } from "../plan/candidatePairs";
import { createSituation } from "../plan/createSituation";
import { createStepChecks, type StepChecks } from "../plan/createStepChecks";
import { partVariants } from "../plan/partVariants";
import type { PlanReason } from "../plan/planDocument";
import type { CheckRequest, PlanRequest } from "../plan/planRequest";
import { readOrder } from "../plan/readOrder";
import type { Situation } from "../plan/situation";

/** One flat of the part with all pairs of tools that fit some bend. */
export interface WhySituation {
  readonly situation: Situation;
  readonly checks: StepChecks;
  /** Does a move come next in the person's own order? Every move does when there is none. */
  readonly follows: (move: number, formed: number) => boolean;
}

export interface WhySituations {
  readonly each: readonly WhySituation[];
  /** Why there are no tools to look at, where there are none. */
  readonly reasons: readonly PlanReason[];
  /** mm; null when the part cannot be built. */
  readonly thickness: number | null;
}

/** The flats that a plan would look at, the likeliest first, every order free in them; a person's order is kept beside. */
export function situationsOf(request: PlanRequest | CheckRequest): WhySituations {
  const { document, machine, tools, airForceFactor, wishes } = request;
  const variants = partVariants(request);
  const order = masksOf(request);
  const each: WhySituation[] = [];
  const reasons: PlanReason[] = [];
  for (const variant of variants.ok ? variants.value : []) {
    const found = candidatePairs(tools, machine, variant.part.thickness, variant.wantedV, document.units);
    if (found.pairs.length === 0) {
      reasons.push(...found.reasons);
      continue;
    }
    const facts = { variant, machine, units: document.units, pairs: found.pairs, airForceFactor, wishes };
    const situation = createSituation(facts);
    const follows = order === null ? () => true : createSituation({ ...facts, order }).allowed;
    each.push({ situation, checks: createStepChecks(situation), follows });
  }
  return { each, reasons, thickness: variants.ok ? variants.value[0]?.part.thickness ?? null : null };
}

function masksOf(request: PlanRequest | CheckRequest): readonly number[] | null {
  if (!("order" in request)) return null;
  const built = buildPart(request.document, { materials: request.materials });
  const read = built.ok ? readOrder(built.value, request.order) : null;
  return read?.ok ? read.value : null;
}
