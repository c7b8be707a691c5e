import { formatLength } from "../../core/formatLength";
import { kiloNewton, mm } from "../../core/units";
import type { ChangeKind, PlanChange } from "../../plan/planChange";
import type { ReasonKind } from "../../plan/planDocument";
import { leastAmount } from "../leastAmount";
import { offeredChange } from "../offeredChange";
import type { WhyFacts } from "../whyFacts";
import { inUnits } from "./inUnits";
import { lengthAmount } from "./lengthAmount";

const MORE_MM = [20, 50, 100, 200, 400, 1000, 3000];
const LENGTH_MM = 5;
const MORE_FORCE = [1.1, 1.25, 1.5, 2, 3];
const FORCE_KN = 1;

interface Length { readonly field: "daylight" | "stroke" | "bedLength" | "betweenFrames" | "throatDepth"; readonly kind: ChangeKind; readonly name: string; readonly against: readonly ReasonKind[] }

const LENGTHS: readonly Length[] = [
  { field: "daylight", kind: "daylight", name: "daylight", against: ["clearance", "daylight"] },
  { field: "stroke", kind: "stroke", name: "stroke", against: ["clearance"] },
  { field: "bedLength", kind: "bed-length", name: "bed", against: ["bed"] },
  { field: "betweenFrames", kind: "between-frames", name: "width between the frames", against: ["throat"] },
  { field: "throatDepth", kind: "throat", name: "throat", against: ["throat"] },
];

/** Another brake: more daylight, a longer stroke, bed or throat, more force; each by itself. */
export function machineChanges(facts: WhyFacts): readonly PlanChange[] {
  const { attempts, kinds } = facts;
  const { machine, document: { units } } = attempts.request;
  attempts.doing("Looking whether another brake would do");
  const lengths = LENGTHS.filter(({ against }) => against.some((kind) => kinds.has(kind))).flatMap(({ field, kind, name }) => {
    const before = attempts.plans();
    const found = leastAmount({
      attempts, from: machine[field], asItIs: true, ladder: MORE_MM.map((more) => Math.ceil((machine[field] + more) / LENGTH_MM) * LENGTH_MM), resolution: LENGTH_MM,
      change: (value) => ({ machine: { ...machine, [field]: mm(value) } }),
    });
    return found === null ? [] : [offeredChange(attempts, before, inUnits(found, LENGTH_MM, units), {
      kind, group: "machine", what: {}, amount: lengthAmount(name, found.value, units, machine[field]), with: [],
      message: `A brake like ${machine.name} with at least ${formatLength(found.value, units)} of ${name} (it has ${formatLength(machine[field], units)}) would do.`,
    })];
  });
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
