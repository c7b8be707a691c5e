import type { PlanCounts } from "../plan/planCounts";
import type { PlanDocument } from "../plan/planDocument";
import { checkOrder } from "../plan/checkOrder";
import { createPlanMemory } from "../plan/planMemory";
import { planPart } from "../plan/planPart";
import type { CheckRequest, PlanRequest } from "../plan/planRequest";
import type { PlanRobustness, RobustnessEnd, SettingRobustness, TimeSetting } from "../plan/planRobustness";
import { rounded } from "../plan/rounded";
import { machineDefaults } from "../tooling/machineDefaults";
import { lowerEnvelopeEnd } from "./lowerEnvelopeEnd";
import { timeSettings } from "./timeSettings";
import type { WhyLimits } from "./whyLimits";

/** Factors of a setting that are looked at. */
const RANGE = [0.25, 4] as const;
/** Plans that may be made unless the limits say otherwise. */
const MOST_PLANS = 120;

/** A plan's counts, as much of it as the others have. */
interface Counted { readonly plan: PlanDocument; readonly counts: PlanCounts }

/**
 * How far each time setting may be off before another plan takes less time, the others as they are. `plan`: the answer to the request; unless it
 * is proven optimal (with its counts) nothing is settled. A cost is linear in the settings, so the least cost is a lower envelope of lines
 * whose corners are found exactly by planning where two lines cross (Eisner and Severance 1976).
 */
export function robustness(request: PlanRequest | CheckRequest, plan: PlanDocument, limits: WhyLimits = {}): PlanRobustness {
  const memory = createPlanMemory();
  const known = new Map<string, Counted | null>();
  const most = limits.plans ?? MOST_PLANS;
  let made = 0;
  const at = (setting: TimeSetting, seconds: number): Counted | null => {
    const key = `${setting}/${seconds}`;
    const answer = known.get(key);
    if (answer !== undefined) return answer;
    if (made >= most || limits.shouldStop?.()) return null;
    made += 1;
    limits.onProgress?.({ expanded: made, fraction: null, message: "Looking how firm the plan is" });
    const machine = { ...request.machine, times: { ...request.machine.times, [setting]: seconds } };
    const asked = { ...request, machine, memory, alternatives: 0, firstPlan: false, shouldStop: limits.shouldStop ?? (() => false), onProgress: () => undefined };
    const found = "order" in asked ? checkOrder(asked) : planPart(asked);
    const counted = found.status === "optimal" && found.counts ? { plan: found, counts: found.counts } : null;
    known.set(key, counted);
    return counted;
  };
  const settings = timeSettings.map((one): SettingRobustness => {
    const { setting } = one;
    const seconds = request.machine.times[setting];
    const own = plan.counts;
    const paid = own === undefined ? 0 : payments(own, one, plan.batch);
    const frame = { setting, seconds, count: rounded(paid) };
    if (own === undefined || plan.status !== "optimal") return { ...frame, low: null, high: null, settled: false };
    const line = (counts: PlanCounts) => ({ slope: payments(counts, one, plan.batch), rest: restOf(counts, request, plan.batch, setting) });
    const least = (value: number) => {
      const found = at(setting, value);
      return found && { ...line(found.counts), found };
    };
    const scale = seconds > 0 ? seconds : machineDefaults.times[setting];
    const lower = seconds > 0 ? lowerEnvelopeEnd(line(own), least, seconds, seconds * RANGE[0]) : NOTHING_ELSE;
    // What is never paid for cannot get dearer than the others' share of it.
    const upper = paid === 0 ? NOTHING_ELSE : lowerEnvelopeEnd(line(own), least, seconds, scale * RANGE[1]);
    const end = (found: typeof lower): RobustnessEnd | null => (found.kind === "taken over" ? endOf(found.at, seconds, found.by.found, own) : null);
    return { ...frame, low: end(lower), high: end(upper), settled: lower.kind !== "open" && upper.kind !== "open" };
  });
  return { range: RANGE, settings, plans: made };
}

const NOTHING_ELSE = { kind: "kept" } as const;

const payments = (counts: PlanCounts, { count, eachPart }: (typeof timeSettings)[number], batch: number): number => counts[count] * (eachPart ? batch : 1);

/** What a plan costs beside one of the settings, s. */
const restOf = (counts: PlanCounts, { machine }: PlanRequest, batch: number, without: TimeSetting): number =>
  timeSettings.reduce((sum, one) => (one.setting === without ? sum : sum + payments(counts, one, batch) * machine.times[one.setting]), 0);

function endOf(at: number, seconds: number, { plan, counts }: Counted, own: PlanCounts): RobustnessEnd {
  const differs = timeSettings.flatMap(({ count, one, many }) => {
    const more = Number((counts[count] - own[count]).toFixed(2));
    return more === 0 ? [] : [`${Math.abs(more)} ${Math.abs(more) === 1 ? one : many} ${more > 0 ? "more" : count === "metres" ? "less" : "fewer"}`];
  }).join(", ");
  return { seconds: rounded(at), factor: seconds > 0 ? rounded(at / seconds) : null, other: { order: plan.order, stations: plan.stations.length, counts }, differs };
}
