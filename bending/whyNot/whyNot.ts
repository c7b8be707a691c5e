import { buildPart } from "../part/buildPart";
import type { ChangeGroup, PlanChange } from "../plan/planChange";
import type { PlanFailure } from "../plan/planFailure";
import type { PlanDocument } from "../plan/planDocument";
import type { CheckRequest, PlanRequest } from "../plan/planRequest";
import { angleChanges } from "./changes/angleChanges";
import { choiceChanges } from "./changes/choiceChanges";
import { flangeChanges } from "./changes/flangeChanges";
import { heightChanges } from "./changes/heightChanges";
import { hemDieChanges } from "./changes/hemDieChanges";
import { leaveOutChanges } from "./changes/leaveOutChanges";
import { machineChanges } from "./changes/machineChanges";
import { openingChanges } from "./changes/openingChanges";
import { orderChanges } from "./changes/orderChanges";
import { ratingChanges } from "./changes/ratingChanges";
import { reliefChanges } from "./changes/reliefChanges";
import { sectionChanges } from "./changes/sectionChanges";
import { settingChanges } from "./changes/settingChanges";
import { widthChanges } from "./changes/widthChanges";
import { createAttempts } from "./createAttempts";
import { firstFailure } from "./firstFailure";
import { factsOf } from "./factsOf";
import type { WhyLimits } from "./whyLimits";

export interface WhyNot {
  readonly firstFailure: PlanFailure | null;
  /** Those of order first, then pieces, tools, a machine, the part, settings; within a group the cheapest plan first, a flange left out last. */
  readonly changes: readonly PlanChange[];
  /** Plans made for it. */
  readonly plans: number;
  /** False when the limits ended it before every kind of change was tried. */
  readonly complete: boolean;
}

const GROUPS: readonly ChangeGroup[] = ["order", "stock", "tool", "machine", "part", "setting"];

/** In the order in which they are worth knowing, as time may end. */
const CHANGES = [
  choiceChanges, orderChanges, sectionChanges, reliefChanges, openingChanges, angleChanges, ratingChanges, hemDieChanges, heightChanges, flangeChanges, widthChanges, machineChanges, leaveOutChanges, settingChanges,
];

/** Changes that a person's own order is no reason for. */
const NOT_OF_ORDER: readonly ((typeof CHANGES)[number])[] = [flangeChanges, machineChanges, leaveOutChanges, settingChanges];

/**
 * Why there is no plan, and the least changes with which there is one, each found and proven least by planning again. `plan`: the answer to the
 * request, infeasible or unknown; for one that has steps there is nothing to say. Deterministic but for `shouldStop`.
 */
export function whyNot(request: PlanRequest | CheckRequest, plan: PlanDocument, limits: WhyLimits = {}): WhyNot {
  if (plan.steps.length > 0 || !buildPart(request.document, { materials: request.materials }).ok) return { firstFailure: null, changes: [], plans: 0, complete: true };
  const attempts = createAttempts(request, plan, limits);
  const failure = firstFailure(request, limits.shouldStop);
  const facts = factsOf(request, plan, failure, attempts);
  const changes: PlanChange[] = [];
  for (const find of CHANGES) {
    // Where another order works, neither part nor brake nor settings are at fault.
    const atFault = !changes.some(({ group }) => group === "order") || !NOT_OF_ORDER.includes(find);
    if (atFault && !attempts.ended()) changes.push(...find(facts));
  }
  const sorted = changes.sort((a, b) => GROUPS.indexOf(a.group) - GROUPS.indexOf(b.group) || lessMade(a) - lessMade(b) || a.plan.cost - b.plan.cost);
  return { firstFailure: failure, changes: sorted, plans: attempts.plans(), complete: !attempts.ended() };
}

/** A part with something left out takes less time, which says nothing. */
const lessMade = ({ kind }: PlanChange): number => (kind === "leave-out" ? 1 : 0);
