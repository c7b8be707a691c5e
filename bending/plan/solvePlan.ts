import { MAX_BENDS, DEMERIT_SECONDS } from "../order/orderProblem";
import { candidatePairs } from "./candidatePairs";
import { createSituation, withPairs } from "./createSituation";
import { createStepChecks, type StepChecks } from "./createStepChecks";
import { emptyPlan } from "./emptyPlan";
import { flatLength } from "./flatLength";
import { hemReason } from "./hemReason";
import { explain } from "./explain";
import { partVariants, type PartVariant } from "./partVariants";
import { planFlat } from "./planFlat";
import type { PlanDocument, PlanReason } from "./planDocument";
import type { PlanRequest } from "./planRequest";
import { proofMethod } from "./proofMethod";
import { shortlist } from "./shortlist";
import type { SearchBudget } from "./searchBudget";
import type { Situation } from "./situation";
import { solveVariant, type Candidate, type VariantAnswer } from "./solveVariant";
import { writePlan } from "./writePlan";

interface Solved {
  readonly situation: Situation;
  readonly checks: StepChecks;
  readonly answer: VariantAnswer;
}

/** The plan, free or along a person's own order (bends of each stroke as masks). */
export function solvePlan(request: PlanRequest, order?: readonly number[]): PlanDocument {
  const variants = partVariants(request);
  if (!variants.ok) return refused(request, variants.error.map(({ path, message }) => reasonOf("part", `${path}: ${message}`)));
  const first = variants.value[0];
  if (first === undefined) return refused(request, [reasonOf("no-die", "there is no flat to plan")]);
  const bends = first.part.bends.length;
  if (bends > MAX_BENDS) return withFlat(refused(request, [reasonOf("order", `the part has ${bends} bends; up to ${MAX_BENDS} are planned`)]), first, request);
  const hems = first.part.bends.flatMap((bend) => hemReason(bend) ?? []);
  if (hems.length > 0) return withFlat(refused(request, hems), first, request);
  const budget = budgetOf(request);
  const solved: Solved[] = [];
  const toolReasons: PlanReason[] = [];
  for (const variant of variants.value) {
    const outcome = solveOne(request, variant, budget, order);
    if ("reasons" in outcome) { toolReasons.push(...outcome.reasons); continue; }
    solved.push(outcome);
    if (outcome.answer.candidates.length > 0) break;
  }
  return withFlat(joined(request, solved, toolReasons), first, request);
}

function solveOne(request: PlanRequest, variant: PartVariant, budget: SearchBudget, order: readonly number[] | undefined): Solved | { readonly reasons: readonly PlanReason[] } {
  const { machine, tools, document } = request;
  const found = candidatePairs(tools, machine, variant.part.thickness, variant.wantedV, document.units);
  if (found.pairs.length > 0) {
    const situation = createSituation({ variant, machine, units: document.units, pairs: found.pairs, ...(order ? { order } : {}) });
    const short = withPairs(situation, shortlist(situation));
    if (short.pairs.length > 0) {
      const checks = createStepChecks(short);
      const answer = solveVariant(short, checks, budget, Infinity);
      if (answer.candidates.length > 0 || answer.stopped || short.pairs.length === situation.pairs.length) return { situation: short, checks, answer };
    }
    const checks = createStepChecks(situation);
    if (situation.pairs.length > 0) return { situation, checks, answer: solveVariant(situation, checks, budget, Infinity) };
    const reasons = explain(situation, checks, []);
    return { reasons: reasons.length > 0 ? reasons : found.reasons };
  }
  return { reasons: found.reasons };
}

function joined(request: PlanRequest, solved: readonly Solved[], toolReasons: readonly PlanReason[]): PlanDocument {
  const expanded = solved.reduce((sum, { answer }) => sum + answer.expanded, 0);
  const all = solved.flatMap((one) => one.answer.candidates.map((candidate) => ({ one, candidate }))).sort((a, b) => a.candidate.weight - b.candidate.weight);
  const method = proofMethod(solved.map(({ answer }) => answer));
  const best = all[0];
  if (best === undefined) {
    const stopped = solved.some(({ answer }) => answer.stopped);
    const possible = solved.some(({ answer }) => answer.deadEnds === null);
    const reasons = [...toolReasons, ...solved.flatMap(({ situation, checks, answer }) => (answer.deadEnds ? explain(situation, checks, answer.deadEnds) : []))];
    if (stopped) return unknown(request, method, expanded, reasonOf("budget", `no order was found in the time given, after ${expanded} states; more time may find one`));
    if (possible) return unknown(request, method, expanded, reasonOf("sections", "every bend can be made, but no bed of up to three stations that was tried holds them all; more pieces or another pair may"));
    return { ...refused(request, onceEach(reasons)), proof: { method, expanded, bound: 0 } };
  }
  const bound = Math.min(...solved.map(({ answer }) => answer.bound));
  const write = ({ one, candidate }: { readonly one: Solved; readonly candidate: Candidate }) => writePlan(one.situation, one.checks, candidate,
    { batch: request.batch, expanded, method, flatLength: (flat) => flatLength(request.document, flat), bound: Math.max(0, bound - best.candidate.demerits * DEMERIT_SECONDS * request.batch) });
  const plan = write(best);
  const others = all.slice(1, 1 + (request.alternatives ?? 0)).map(write);
  return others.length === 0 ? plan : { ...plan, alternatives: others.map((other) => ({ ...other, status: "feasible" as const })) };
}

const reasonOf = (kind: PlanReason["kind"], message: string): PlanReason => ({ kind, bends: [], faces: [], tools: [], message });

const frameOf = ({ document, machine, batch }: PlanRequest) => ({ part: document.name, machine: machine.name, units: document.units, batch });

const refused = (request: PlanRequest, reasons: readonly PlanReason[]): PlanDocument =>
  emptyPlan({ ...frameOf(request), status: "infeasible", method: "decided before any search", reasons });

const unknown = (request: PlanRequest, method: string, expanded: number, reason: PlanReason): PlanDocument =>
  ({ ...emptyPlan({ ...frameOf(request), status: "unknown", method, reasons: [reason] }), proof: { method, expanded, bound: 0 } });

/** A plan without steps still tells the flat. */
function withFlat(plan: PlanDocument, { part }: PartVariant, { document }: PlanRequest): PlanDocument {
  if (plan.flat.bends.length > 0 || plan.flat.width > 0) return plan;
  const flat = planFlat(part, document.units);
  return { ...plan, flat, flatLength: flatLength(document, flat) };
}

function onceEach(reasons: readonly PlanReason[]): readonly PlanReason[] {
  const seen = new Set<string>();
  return reasons.filter(({ message }) => !seen.has(message) && seen.add(message));
}

function budgetOf(request: PlanRequest): SearchBudget {
  return {
    shouldStop: request.shouldStop ?? (() => false),
    onProgress: request.onProgress ?? (() => undefined),
    batch: request.batch,
    keep: 1 + (request.alternatives ?? 0),
  };
}
