import { describe, expect, it, vi } from "vitest";
import { mm } from "@/bending/core/units";
import { checkOrder } from "@/bending/plan/checkOrder";
import type { PlanDocument } from "@/bending/plan/planDocument";
import { planPart } from "@/bending/plan/planPart";
import type { PlanRequest } from "@/bending/plan/planRequest";
import { verifyPlan } from "../corpus/verifyPlan";
import { inInches, mirroredPart, relistedFlanges, renamedFlanges, reversedProfile, turnedOver } from "./changedDocument";
import { lawRequests, withLengths } from "./lawRequests";
import { comparePlans, planDemerits } from "./planDemerits";
import { richTools } from "./richTools";

vi.setConfig({ testTimeout: 300_000 });

const parts = lawRequests(4);
const plans = new Map<PlanRequest, PlanDocument>();

/** The plan of a request, worked out once. */
function planned(request: PlanRequest): PlanDocument {
  const known = plans.get(request) ?? planPart(request);
  plans.set(request, known);
  return known;
}

const settled = (plan: PlanDocument) => ({ ...plan, elapsedMs: 0 });

/** As good as each other: status, unmet wishes, time. */
function expectAlike(changed: PlanDocument, plan: PlanDocument, name: string): void {
  expect({ status: changed.status, demerits: planDemerits(changed), stations: changed.stations.length }, name).toEqual({ status: plan.status, demerits: planDemerits(plan), stations: plan.stations.length });
  expect(changed.cost, name).toBeCloseTo(plan.cost, 4);
}

describe("laws of whole plans", () => {
  it("are asked of parts that can be made and of parts that cannot, on one station and on more", () => {
    const all = parts.map(({ request }) => planned(request));
    expect(new Set(all.map(({ status }) => status))).toEqual(new Set(["optimal", "infeasible"]));
    expect(new Set(all.map(({ stations }) => stations.length))).toEqual(new Set([0, 1, 2]));
    parts.forEach(({ name, request }) => expect(planned(request).steps.length > 0 ? verifyPlan(planned(request), request) : [], name).toEqual([]));
  });

  it("the same question has the same answer, to the last byte", () => {
    for (const { request, name } of parts) expect(JSON.stringify(settled(planPart(request))), name).toBe(JSON.stringify(settled(planned(request))));
  });

  it("names of tools, pieces and flanges decide nothing", () => {
    for (const { request, name } of parts) {
      const plan = planned(request);
      const called = (id: string) => `${9 - id.length}${[...id].reverse().join("")}`;
      const tools = request.tools.map((tool) => ({ ...tool, id: called(tool.id), pieces: tool.pieces.map((piece) => ({ ...piece, id: called(piece.id) })) }));
      const renamed = planPart({ ...request, tools, document: renamedFlanges(request.document, called) });
      expectAlike(renamed, plan, name);
      const ids = request.document.flanges ? plan.order.map((hit) => hit.split("+").map(called).join("+")) : plan.order;
      expect(renamed.order, name).toEqual(ids);
      expect(renamed.steps.map(({ punch }) => punch)).toEqual(plan.steps.map(({ punch }) => called(punch)));
    }
  });

  it("neither does the order in which tools, pieces and flanges are listed", () => {
    for (const { request, name } of parts) {
      const tools = [...request.tools].reverse().map((tool) => ({ ...tool, pieces: [...tool.pieces].reverse() }));
      expectAlike(planPart({ ...request, tools }), planned(request), name);
      if (request.document.flanges) expectAlike(planPart({ ...request, document: relistedFlanges(request.document) }), planned(request), name);
    }
  });

  it("a part in the mirror, turned over or drawn from its other end costs the same", () => {
    for (const { request, name } of parts) {
      for (const change of [mirroredPart, turnedOver, ...(request.document.profile ? [reversedProfile] : [])]) {
        const document = change(request.document);
        if (document !== request.document) expectAlike(planPart({ ...request, document }), planned(request), `${name}, ${change.name}`);
      }
    }
  });

  it("more clearance never makes a plan better", () => {
    for (const { request, name } of parts) {
      let best = planned(request);
      for (const clearance of [1.5, 6]) {
        const next = planPart({ ...request, machine: { ...request.machine, settings: { ...request.machine.settings, clearance: mm(clearance) } } });
        expect(comparePlans(next, best), `${name}, ${clearance} mm`).toBeGreaterThanOrEqual(0);
        best = next;
      }
    }
  });

  it("a tool less never makes a plan better", () => {
    for (const { request, name } of parts) {
      for (const tool of request.tools) {
        const fewer = planPart({ ...request, tools: request.tools.filter((one) => one !== tool) });
        expect(comparePlans(fewer, planned(request)), `${name} without ${tool.id}`).toBeGreaterThanOrEqual(0);
      }
    }
  });

  it("tools by the dozen, of which not every pair is looked at first, never make a plan worse", () => {
    const { request } = parts.find(({ name }) => name === "tree 3") ?? parts[0]!;
    const few = planned(request);
    expect(planDemerits(few)).toBeGreaterThan(0);
    const many = planPart({ ...request, tools: richTools(request.tools, request.tools[0]?.pieces.map(({ length }) => length) ?? []) });
    expect(many.proof.method).toMatch(/with \d+ of the \d+ tool pairs/);
    expect(comparePlans(many, few)).toBeLessThanOrEqual(0);
  });

  it("a longer piece or one more in stock never makes a plan worse", () => {
    for (const { request, name } of parts) {
      for (const length of [400, 65]) {
        const more = planPart({ ...request, tools: request.tools.map((tool) => withLengths(tool, [...tool.pieces.map((piece) => piece.length as number), length])) });
        expect(comparePlans(more, planned(request)), `${name} and ${length} mm`).toBeLessThanOrEqual(0);
      }
    }
  });

  it("twice the times are twice the cost, in the same order", () => {
    for (const { request, name } of parts) {
      const times = Object.fromEntries(Object.entries(request.machine.times).map(([key, seconds]) => [key, 2 * seconds])) as unknown as PlanRequest["machine"]["times"];
      const [plan, twice] = [planned(request), planPart({ ...request, machine: { ...request.machine, times } })];
      expect(twice.cost, name).toBeCloseTo(2 * plan.cost, 4);
      expect(twice.order, name).toEqual(plan.order);
    }
  });

  it("a larger batch never takes less time in all, nor more for each part", () => {
    for (const { request, name } of parts) {
      const rising = [1, 20, 2000].map((batch) => (batch === request.batch ? planned(request) : planPart({ ...request, batch }))).filter(({ status }) => status === "optimal");
      rising.slice(1).forEach((plan, i) => {
        const before = rising[i] as PlanDocument;
        expect(plan.cost, name).toBeGreaterThanOrEqual(before.cost - 1e-6);
        if (planDemerits(plan) === planDemerits(before)) expect(plan.seconds.perPart, name).toBeLessThanOrEqual(before.seconds.perPart + 1e-6);
      });
    }
  });

  it("a plan's own order, asked for, gives the plan back", () => {
    for (const { request, name } of parts) {
      const plan = planned(request);
      if (plan.status !== "optimal") continue;
      const own = checkOrder({ ...request, order: [...plan.order] });
      expectAlike(own, plan, name);
      expect(own.order).toEqual(plan.order);
      expect(verifyPlan(own, request)).toEqual([]);
    }
  });

  it("a part in inches is the part in millimetres", () => {
    for (const { request, name } of parts) {
      const inch = planPart({ ...request, document: inInches(request.document) });
      expect(inch.units).toBe("in");
      expectAlike(inch, planned(request), name);
      expect(inch.flat.width * 25.4).toBeCloseTo(planned(request).flat.width, 3);
    }
  });

  it("stopped at any moment it shows a plan that holds, or none, and a bound that no plan goes below", () => {
    const seen = new Set<string>();
    for (const { request, name } of parts) {
      const best = planned(request);
      for (const after of [0, 7, 70, 700]) {
        let asked = 0;
        const plan = planPart({ ...request, shouldStop: () => (asked += 1) > after });
        seen.add(plan.status);
        if (best.status === "infeasible") { expect(["unknown", "infeasible"], name).toContain(plan.status); continue; }
        if (planDemerits(plan) === planDemerits(best)) expect(plan.proof.bound, name).toBeLessThanOrEqual(best.cost + 1e-6);
        if (plan.status === "unknown") continue;
        expect(comparePlans({ ...plan, status: "optimal" }, best), name).toBeGreaterThanOrEqual(0);
        expect(verifyPlan(plan, request), name).toEqual([]);
      }
    }
    expect([...seen].sort()).toEqual(expect.arrayContaining(["feasible", "optimal", "unknown"]));
  });
});
