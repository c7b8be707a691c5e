import { MAX_BENDS, DEMERIT_SECONDS } from "../order/orderProblem";
import { candidatePairs } from "./candidatePairs";
import { createSituation, withPairs } from "./createSituation";
import { createStepChecks, type StepChecks } from "./createStepChecks";
import { drawnReason } from "./drawnPlan";
import { emptyPlan } from "./emptyPlan";
import { flatLength } from "./flatLength";
import { hemReason } from "./hemReason";
import { explain } from "./explain";
import { pairsOfFewerWishes } from "./pairsOfFewerWishes";
import { partVariants, type PartVariant } from "./partVariants";
import { planFlat } from "./planFlat";
import { createPlanMemory } from "./planMemory";
import type { PlanDocument, PlanReason } from "./planDocument";
import type { PlanRequest } from "./planRequest";
import { proofMethod } from "./proofMethod";
import { shortlist, SHORTLISTS } from "./shortlist";
import { createBudget, type SearchBudget } from "./createBudget";
import type { Situation } from "./situation";
import type { Candidate } from "./createCandidateKeeper";
import { solveVariant, type VariantAnswer } from "./solveVariant";
import { writePlan } from "./writePlan";

interface Solved {
  readonly variant: PartVariant;
  readonly situation: Situation;
  readonly checks: StepChecks;
  readonly answer: VariantAnswer;
  /** Pairs that fit some bend, looked over or not. */
  readonly allPairs: number;
}

/** The plan, free or along a person's own order (bends of each stroke as masks). */
export function solvePlan(request: PlanRequest, order?: readonly number[]): PlanDocument {
  const variants = partVariants(request);
  if (!variants.ok) return refused(request, variants.error.map(({ path, message }) => reasonOf("part", `${path}: ${message}`)));
  const first = variants.value[0];
  if (first === undefined) return refused(request, [reasonOf("no-die", "there is no flat to plan")]);
  const bends = first.drawn.bends.length;
  if (bends > MAX_BENDS) return withFlat(refused(request, [reasonOf("order", `the part has ${bends} bends; up to ${MAX_BENDS} are planned`)]), first, request);
  const hems = first.drawn.bends.flatMap((bend) => hemReason(bend, request.tools) ?? []);
  if (hems.length > 0) return withFlat(refused(request, hems), first, request);
  const { solved, toolReasons } = solveVariants(request, variants.value, createBudget(request), order);
  return withFlat(joined(request, solved, toolReasons, variants.value.length, order !== undefined), first, request);
}

/**
 * Flat by flat the shortlist of pairs, and where it leaves wishes unmet that others would not, these with it; only when none of them gives a plan, flat by
 * flat all pairs.
 */
function solveVariants(request: PlanRequest, variants: readonly PartVariant[], budget: SearchBudget, order: readonly number[] | undefined): { readonly solved: readonly Solved[]; readonly toolReasons: readonly PlanReason[] } {
  const solved: Solved[] = [];
  const toolReasons: PlanReason[] = [];
  const left: { readonly variant: PartVariant; readonly situation: Situation }[] = [];
  const memory = request.memory ?? createPlanMemory();
  const solve = (variant: PartVariant, situation: Situation, allPairs: number): boolean => {
    const key = `${variants.indexOf(variant)}/${situation.pairs.length}`;
    const checks = memory.checks.get(key) ?? createStepChecks(situation);
    memory.checks.set(key, checks);
    const answer = solveVariant(situation, checks, budget);
    solved.push({ variant, situation, checks, answer, allPairs });
    return answer.candidates.length > 0 || answer.stopped;
  };
  for (const [place, variant] of variants.entries()) {
    const found = candidatePairs(request.tools, request.machine, variant.part.thickness, variant.wantedV, request.document.units);
    toolReasons.push(...(found.pairs.length === 0 ? found.reasons : []));
    if (found.pairs.length === 0) continue;
    const facts = { variant, machine: request.machine, units: request.document.units, pairs: found.pairs, airForceFactor: request.airForceFactor, wishes: request.wishes, ...(order ? { order } : {}) };
    const situation = { ...memory.situations.get(place) ?? createSituation(facts), machine: request.machine };
    memory.situations.set(place, situation);
    if (situation.pairs.length === 0) {
      const reasons = explain(situation, createStepChecks(situation), 0);
      toolReasons.push(...(reasons.length > 0 ? reasons : found.reasons));
      continue;
    }
    const listed = shortlist(situation, SHORTLISTS[0]);
    const short = withPairs(situation, listed);
    if (solve(variant, short, situation.pairs.length)) {
      const first = solved[solved.length - 1];
      const unmet = first?.answer.candidates[0]?.demerits ?? 0;
      const others = unmet > 0 && listed.length < situation.pairs.length ? pairsOfFewerWishes(situation, unmet, budget) : [];
      const more = situation.pairs.filter((pair) => listed.includes(pair) || others.includes(pair));
      if (more.length > listed.length) {
        solved.pop();
        solve(variant, withPairs(situation, more), situation.pairs.length);
        if (first && solved[solved.length - 1]?.answer.stopped) solved.push(first);
      }
      return { solved, toolReasons };
    }
    if (short.pairs.length < situation.pairs.length) left.push({ variant, situation });
  }
  for (const longer of [(situation: Situation) => withPairs(situation, shortlist(situation, SHORTLISTS[1])), (situation: Situation) => situation]) {
    for (const { variant, situation } of left) {
      const before = solved.findIndex((one) => one.variant === variant);
      const wider = longer(situation);
      if (wider.pairs.length <= (solved[before]?.situation.pairs.length ?? 0)) continue;
      solved.splice(before, 1);
      if (solve(variant, wider, situation.pairs.length)) return { solved, toolReasons };
    }
  }
  return { solved, toolReasons };
}

function joined(request: PlanRequest, solved: readonly Solved[], toolReasons: readonly PlanReason[], flats: number, ordered: boolean): PlanDocument {
  const expanded = solved.reduce((sum, { answer }) => sum + answer.expanded, 0);
  const all = solved.flatMap((one) => one.answer.candidates.map((candidate) => ({ one, candidate }))).sort((a, b) => a.candidate.weight - b.candidate.weight);
  const method = proofMethod(solved.map(({ variant, answer, allPairs }) => ({ vOpening: variant.vOpening, answer, allPairs })), flats, ordered);
  const best = all[0];
  if (best === undefined) {
    const stopped = solved.some(({ answer }) => answer.stopped);
    const possible = solved.some(({ answer }) => answer.deadEnd === null);
    const reasons = [...toolReasons, ...solved.flatMap(({ situation, checks, answer }) => (answer.deadEnd ? explain(situation, checks, answer.deadEnd()) : []))];
    if (stopped) return unknown(request, method, expanded, reasonOf("budget", `no order was found in the time and memory that a plan is given, after ${expanded} states; more time may find one`));
    if (possible) return unknown(request, method, expanded, reasonOf("sections", "every bend can be made, but no bed that was tried holds them all; more pieces or another pair may"));
    return { ...refused(request, onceEach(reasons).map(drawnReason)), proof: { method, expanded, bound: 0 } };
  }
  const bound = Math.min(...solved.map(({ answer }) => answer.bound));
  const floor = Math.min(...solved.map(({ answer }) => answer.floor));
  const write = ({ one, candidate }: { readonly one: Solved; readonly candidate: Candidate }) => writePlan(one.situation, one.checks, candidate,
    { batch: request.batch, expanded, method, flatLength: (flat) => flatLength(request.document, flat), bound: Math.max(floor, bound - best.candidate.demerits * DEMERIT_SECONDS * request.batch) });
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
function withFlat(plan: PlanDocument, { drawn: part }: PartVariant, { document }: PlanRequest): PlanDocument {
  if (plan.flat.bends.length > 0 || plan.flat.width > 0) return plan;
  const flat = planFlat(part, document.units);
  return { ...plan, flat, flatLength: flatLength(document, flat) };
}

function onceEach(reasons: readonly PlanReason[]): readonly PlanReason[] {
  const seen = new Set<string>();
  return reasons.filter(({ message }) => !seen.has(message) && seen.add(message));
}
