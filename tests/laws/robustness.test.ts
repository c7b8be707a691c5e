import { describe, expect, it } from "vitest";
import type { PlanCounts } from "@/bending/plan/planCounts";
import { createPlanMemory } from "@/bending/plan/planMemory";
import { planPart } from "@/bending/plan/planPart";
import type { PlanRequest } from "@/bending/plan/planRequest";
import { readPlanDocument } from "@/bending/plan/readPlanDocument";
import type { MachineTimes } from "@/bending/tooling/machine";
import { robustness } from "@/bending/whyNot/robustness";
import { timeSettings } from "@/bending/whyNot/timeSettings";
import { planCorpus } from "../corpus/planCorpus";

const costOf = (counts: PlanCounts | undefined, times: MachineTimes, batch: number): number =>
  counts === undefined ? NaN : timeSettings.reduce((sum, { setting, count, eachPart }) => sum + counts[count] * times[setting] * (eachPart ? batch : 1), 0);
const withTime = (request: PlanRequest, setting: keyof MachineTimes, seconds: number): PlanRequest =>
  ({ ...request, machine: { ...request.machine, times: { ...request.machine.times, [setting]: seconds } } });

describe("what a plan pays for", () => {
  it.each(["u", "hat", "tray", "tabs", "corrugated-6"])("%s: the counts times the settings are the cost, of the other plans too", (name) => {
    const request = { ...planCorpus(name), alternatives: name === "tray" ? 0 : 2 };
    const plan = planPart(request);
    for (const one of [plan, ...(plan.alternatives ?? [])]) expect(costOf(one.counts, request.machine.times, request.batch)).toBeCloseTo(one.cost, 4);
  });

  it("plans that differ in times share what was worked out, and are the same plans", () => {
    const memory = createPlanMemory();
    const request = planCorpus("hat");
    for (const flip of [4, 1, 9]) {
      const timed = withTime(request, "flip", flip);
      expect(planPart({ ...timed, memory })).toEqual(planPart(timed));
    }
    expect(memory.checks.size).toBeGreaterThan(0);
  });
});

describe("robustness", () => {
  const request = planCorpus("hat");
  const plan = planPart(request);
  const firm = robustness(request, plan);
  const of = (setting: string) => firm.settings.find((one) => one.setting === setting);

  it("hat: one more flip saves one gauge move, so a flip must not fall under a gauge move", () => {
    const { flip, gaugeMove } = request.machine.times;
    expect(of("flip")).toMatchObject({ high: null, settled: true, count: 20, low: { seconds: gaugeMove, factor: gaugeMove / flip, differs: "1 flip more, 1 gauge move fewer" } });
    expect(of("gaugeMove")).toMatchObject({ low: null, settled: true, count: 80, high: { seconds: flip } });
    for (const setting of ["turn", "walkPerMetre", "stroke", "stationSetup", "sectionPlace"]) expect(of(setting)).toMatchObject({ low: null, high: null, settled: true });
  });

  it("corrugated: a flip against two turns", () => {
    const sheet = planCorpus("corrugated-6");
    const { flip, turn } = sheet.machine.times;
    const settings = robustness(sheet, planPart(sheet)).settings;
    expect(settings.find(({ setting }) => setting === "flip")?.high).toMatchObject({ seconds: 2 * turn, differs: "1 flip fewer, 2 quarter turns more" });
    expect(settings.find(({ setting }) => setting === "turn")?.low?.seconds).toBeCloseTo(flip / 2, 6);
  });

  it("inside the ends the plan stays the cheapest, a little beyond another is, and it is the one that was named", () => {
    for (const { setting, seconds, low, high } of firm.settings) {
      for (const [end, into] of [[low, 1.02], [high, 0.98]] as const) {
        if (end === null) continue;
        const own = (value: number) => costOf(plan.counts, { ...request.machine.times, [setting]: value }, request.batch);
        const named = (value: number) => costOf(end.other.counts, { ...request.machine.times, [setting]: value }, request.batch);
        const [inside, beyond] = [end.seconds * into, end.seconds / into];
        expect(planPart(withTime(request, setting, inside)).cost).toBeCloseTo(own(inside), 4);
        expect(planPart(withTime(request, setting, beyond)).cost).toBeCloseTo(named(beyond), 4);
        expect(named(beyond)).toBeLessThan(own(beyond) - 1e-3);
        expect(Math.sign(end.seconds - seconds)).toBe(end === low ? -1 : 1);
      }
    }
  });

  it("is part of the plan document, says what it could not settle, and stops when told", () => {
    expect(readPlanDocument(JSON.parse(JSON.stringify({ ...plan, robustness: firm }))).ok).toBe(true);
    const early = robustness(request, plan, { plans: 1 });
    expect([early.plans, early.settings.some(({ settled }) => !settled)]).toEqual([1, true]);
    expect(robustness(request, { ...plan, status: "feasible" }).settings.every(({ settled, low, high }) => !settled && low === null && high === null)).toBe(true);
  });
});
