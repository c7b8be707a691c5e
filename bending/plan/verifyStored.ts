import { withHems } from "../clearance/withHems";
import { deg, mmPer, rad, toRad } from "../core/units";
import { hitId } from "../strokes/hitId";
import type { PlanDocument } from "./planDocument";
import { plannedPart, type PlannedPart } from "./plannedPart";
import { machineChanges } from "./stored/machineChanges";
import { stationFindings } from "./stored/stationFindings";
import { stepFindings } from "./stored/stepFindings";
import { storedReason, type StoredContext, type StoredStep } from "./stored/storedContext";
import { toolChanges } from "./stored/toolChanges";
import type { ShopNow, StoredCheck, StoredFinding, StoredPlan } from "./storedPlan";

/**
 * Goes through a stored plan as the shop is now: the part is built from the plan's own radii and allowances, and every step is asked
 * of a fresh clearance, with the tools, pieces and machine of today. Nothing is searched and nothing of the search is trusted.
 */
export function verifyStored(stored: StoredPlan, now: ShopNow): StoredCheck {
  const { plan, document, material, tools } = stored;
  const changed = [...machineChanges(stored.machine, now.machine, plan.units), ...toolChanges(tools, now.tools, plan.units)];
  const answer = (wrong: readonly StoredFinding[]): StoredCheck =>
    ({ holds: wrong.length === 0, engine: { planned: plan.engine, now: now.engine }, steps: plan.steps.length, wrong, changed });
  const built = plannedPart(document, (id) => (id === material.id ? material : undefined), plan);
  if (!built.ok) return answer(built.error.map(({ path, message }) => ({ step: null, reason: storedReason("part", `${path}: ${message}`) })));
  const context = contextOf(stored, now, built.value);
  const wrong: StoredFinding[] = stationFindings(context, now).map((reason) => ({ step: null, reason }));
  let formed = 0;
  plan.steps.forEach((step, index) => {
    const of = (reason: StoredFinding["reason"]): StoredFinding => ({ step: index, reason });
    const { bends, front } = built.value.places(step);
    const [punch, die] = [context.toolOf(step.punch), context.toolOf(step.die)];
    const again = bends.some((bend) => bend < 0 || (formed >> bend) & 1);
    if (again || front < 0 || punch?.kind !== "punch" || die?.kind !== "die") {
      wrong.push(of(storedReason("order", `${step.bends.join(" + ")}: the step names what the part or the tool list does not have`, { bends: step.bends })));
      return;
    }
    const joined: StoredStep = { step, hit: { bends, front, formed }, punch, die };
    wrong.push(...stepFindings(context, joined).map(of));
    for (const bend of bends) formed |= 1 << bend;
  });
  const left = context.part.bends.filter((_, bend) => !((formed >> bend) & 1));
  if (left.length > 0) wrong.push({ step: null, reason: storedReason("order", `not every bend is made: ${left.map(({ id }) => id).join(", ")}`, { bends: left.map(({ id }) => id) }) });
  return answer(wrong);
}

function contextOf({ plan, tools }: StoredPlan, now: ShopNow, { part }: PlannedPart): StoredContext {
  const demanded = demandedOf(plan);
  return {
    plan, part, machine: now.machine, units: plan.units, per: mmPer(plan.units), airForceFactor: now.airForceFactor ?? 1,
    clearance: withHems(part, now.machine, { demandedAngle: (bend) => demanded.get(part.bends[bend]?.id ?? "") ?? rad(0) }),
    toolOf: (id) => now.tools.find((tool) => tool.id === id) ?? tools.find((tool) => tool.id === id),
  };
}

const demandedOf = (plan: PlanDocument) => new Map(plan.steps.flatMap((step) => step.bends.map((id) => [step.hit ? hitId(id, step.hit.number, step.hit.of) : id, toRad(deg(step.demandedAngle))] as const)));
