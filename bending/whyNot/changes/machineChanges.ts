import { formatLength } from "../../core/formatLength";
import { kiloNewton, mm } from "../../core/units";
import type { PlanChange } from "../../plan/planChange";
import { leastAmount } from "../leastAmount";
import { offeredChange } from "../offeredChange";
import type { WhyFacts } from "../whyFacts";
import { inUnits } from "./inUnits";
import { lengthAmount } from "./lengthAmount";

const MORE_MM = [20, 50, 100, 200, 400];
const LENGTH_MM = 5;
const MORE_FORCE = [1.1, 1.25, 1.5, 2, 3];
const FORCE_KN = 1;

/** Another brake: more daylight, a longer stroke, more force; each by itself. */
export function machineChanges(facts: WhyFacts): readonly PlanChange[] {
  const { attempts, kinds } = facts;
  const { machine, document: { units } } = attempts.request;
  const open = kinds.has("clearance") || kinds.has("daylight");
  attempts.doing("Looking whether another brake would do");
  const lengths = open ? (["daylight", "stroke"] as const).flatMap((field) => {
    const before = attempts.plans();
    const found = leastAmount({
      attempts, from: machine[field], asItIs: true, ladder: MORE_MM.map((more) => Math.ceil((machine[field] + more) / LENGTH_MM) * LENGTH_MM), resolution: LENGTH_MM,
      change: (value) => ({ machine: { ...machine, [field]: mm(value) } }),
    });
    return found === null ? [] : [offeredChange(attempts, before, inUnits(found, LENGTH_MM, units), {
      kind: field, group: "machine", what: {}, amount: lengthAmount(field, found.value, units, machine[field]), with: [],
      message: `A brake like ${machine.name} with at least ${formatLength(found.value, units)} of ${field} (it has ${formatLength(machine[field], units)}) would do.`,
    })];
  }) : [];
  return [...lengths, ...(kinds.has("force") ? moreForce(facts) : [])];
}

function moreForce({ attempts }: WhyFacts): readonly PlanChange[] {
  const { machine } = attempts.request;
  const before = attempts.plans();
  const found = leastAmount({
    attempts, from: machine.maxForce, asItIs: true, ladder: MORE_FORCE.map((by) => Math.ceil(machine.maxForce * by)), resolution: FORCE_KN,
    change: (force) => ({ machine: { ...machine, maxForce: kiloNewton(force) } }),
  });
  return found === null ? [] : [offeredChange(attempts, before, { ...found, resolution: FORCE_KN }, {
    kind: "force", group: "machine", what: {}, amount: { name: "force", value: found.value, unit: "kN", from: machine.maxForce }, with: [],
    message: `A brake of at least ${found.value} kN (${machine.name} has ${machine.maxForce} kN) would do.`,
  })];
}
