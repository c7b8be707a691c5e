import { describe, expect, it } from "vitest";
import { mmPer } from "@/bending/core/units";
import { checkOrder } from "@/bending/plan/checkOrder";
import type { PlanDocument } from "@/bending/plan/planDocument";
import { planPart } from "@/bending/plan/planPart";
import { askedRequest, planCases, type AskedPlan } from "../corpus/planCase";
import { verifyPlan } from "../corpus/verifyPlan";

const stepOf = (plan: PlanDocument, bend: string) => plan.steps.find(({ bends }) => bends.includes(bend));
const byBend = <T>(wanted: Readonly<Record<string, T>> | undefined) => Object.entries(wanted ?? {});

function punchLength(plan: PlanDocument, bend: string): number {
  const station = plan.stations.find(({ id }) => id === stepOf(plan, bend)?.station);
  return (station?.punchSections ?? []).reduce((sum, { length }) => sum + (length ?? 0), 0) * mmPer(plan.units);
}

function expectPlan(plan: PlanDocument, { expect: wanted }: AskedPlan): void {
  const place = (bend: string) => plan.steps.findIndex(({ bends }) => bends.includes(bend));
  if (wanted.stations !== undefined) expect(plan.stations).toHaveLength(wanted.stations);
  if (wanted.secondsPerPart !== undefined) expect(plan.seconds.perPart).toBeCloseTo(wanted.secondsPerPart, 6);
  for (const [first, second] of wanted.before ?? []) expect(place(first), `${first} before ${second} in ${plan.order.join()}`).toBeLessThan(place(second));
  for (const [bend, punch] of byBend(wanted.punch)) expect(stepOf(plan, bend)?.punch).toBe(punch);
  for (const [bend, front] of byBend(wanted.front)) expect(stepOf(plan, bend)?.front).toBe(front);
  for (const [bend, most] of byBend(wanted.punchAtMost)) expect(punchLength(plan, bend), bend).toBeLessThanOrEqual(most);
  for (const [bend, fingers] of byBend(wanted.fingers)) expect(stepOf(plan, bend)?.gauge.fingers).toHaveLength(fingers);
  for (const bend of wanted.slanted ?? []) {
    const [a, b] = stepOf(plan, bend)?.gauge.fingers ?? [];
    expect(Math.abs((a?.x ?? 0) - (b?.x ?? 0))).toBeGreaterThan(1);
  }
}

describe("known cases of the shop", () => {
  for (const one of planCases()) {
    for (const asked of one.asked) {
      it(`${one.name}: ${asked.say}`, () => {
        const request = askedRequest(one, asked);
        const plan = planPart(request);
        expect(plan.status, plan.reasons.map(({ message }) => message).join("; ")).toBe(asked.expect.status);
        if (plan.status === "infeasible") expect(plan.reasons.length).toBeGreaterThan(0);
        else {
          expect(verifyPlan(plan, request)).toEqual([]);
          expectPlan(plan, asked);
        }
        if (asked.expect.says !== undefined) expect(plan.reasons.map(({ message }) => message).join("; ")).toContain(asked.expect.says);
        for (const { kind } of plan.reasons) expect(asked.expect.reasons ?? [kind]).toContain(kind);
        for (const order of asked.expect.works ?? []) {
          const own = checkOrder({ ...request, order: order.split(" ") });
          expect(own.status, `${order}: ${own.reasons.map(({ message }) => message).join("; ")}`).toBe("optimal");
          expect(own.cost).toBeGreaterThanOrEqual(plan.cost - 1e-6);
        }
        for (const order of asked.expect.fails ?? []) expect(checkOrder({ ...request, order: order.split(" ") }).status, order).toBe("infeasible");
      });
    }
  }
});
