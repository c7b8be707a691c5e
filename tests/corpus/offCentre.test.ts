import { describe, expect, it, vi } from "vitest";
import { mm } from "@/bending/core/units";
import { checkOrder } from "@/bending/plan/checkOrder";
import type { PlanDocument } from "@/bending/plan/planDocument";
import { planPart } from "@/bending/plan/planPart";
import type { PlanRequest } from "@/bending/plan/planRequest";
import { readPlanDocument } from "@/bending/plan/readPlanDocument";
import { planCorpus } from "./planCorpus";
import { verifyPlan } from "./verifyPlan";

vi.setConfig({ testTimeout: 60_000 });

const onBrake = (request: PlanRequest, offCentre: readonly (readonly [number, number])[]): PlanRequest =>
  ({ ...request, machine: { ...request.machine, settings: { ...request.machine.settings, offCentre: offCentre.map(([z, share]) => [mm(z), share] as const) } } });

/** The middle of a one-bend step's line, from the middle of the bed. */
const middles = ({ steps }: PlanDocument) => steps.map(({ bendZ, forceKN }) => ({ z: Math.abs(bendZ[0] + bendZ[1]) / 2, forceKN }));

describe("a load off the middle of the bed", () => {
  const free = planCorpus("tray");
  const without = planPart(free);

  it("is kept within the machine's diagram by moving the stations, the stronger nearer the middle, at no cost", () => {
    // 1350 kN: up to 100 mm off the middle all of it, from 140 mm on 43.2 kN.
    const request = onBrake(free, [[100, 1], [140, 0.032]]);
    expect(middles(without).some(({ z, forceKN }) => z > 140 && forceKN > 43.2)).toBe(true);
    const plan = planPart(request);
    expect([plan.status, plan.cost, verifyPlan(plan, request)]).toEqual([without.status, without.cost, []]);
    for (const { z, forceKN } of middles(plan)) expect(forceKN).toBeLessThanOrEqual((z <= 100 ? 1350 : z >= 140 ? 43.2 : 1350 * (1 - (0.968 * (z - 100)) / 40)) + 1e-3);
    expect(plan.steps.map(({ offCentre }) => offCentre?.z).map((z) => Math.abs(z ?? NaN))).toEqual(middles(plan).map(({ z }) => expect.closeTo(z, 3)));
    expect(readPlanDocument(JSON.parse(JSON.stringify(plan))).ok).toBe(true);
  });

  it("is said where it is near to what the machine bears there", () => {
    const plan = checkOrder({ ...onBrake(free, [[100, 1], [140, 0.032]]), order: without.order });
    const near = plan.steps.filter(({ forceKN, offCentre }) => offCentre && forceKN > 0.8 * offCentre.limitKN);
    expect(plan.cautions.filter(({ message }) => message.includes("from the middle of its bed")).map(({ bends }) => bends)).toEqual(near.map(({ bends }) => bends));
  });

  it("changes nothing where the machine has no diagram, or one that allows all", () => {
    const wide = planPart(onBrake(free, [[10, 1]]));
    expect(without.steps.every(({ offCentre }) => offCentre === undefined)).toBe(true);
    expect([wide.cost, wide.stations]).toEqual([without.cost, without.stations]);
  });
});
