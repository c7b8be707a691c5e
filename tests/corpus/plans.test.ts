import { describe, expect, it, vi } from "vitest";
import { mmPer } from "@/bending/core/units";
import { everyOrder } from "@/bending/order/everyOrder";
import { searchOrder } from "@/bending/order/searchOrder";
import { candidatePairs } from "@/bending/plan/candidatePairs";
import { checkOrder } from "@/bending/plan/checkOrder";
import { createSituation } from "@/bending/plan/createSituation";
import { createGaugeNumbers } from "@/bending/plan/gaugeNumbers";
import { createStepChecks } from "@/bending/plan/createStepChecks";
import { layoutProblem } from "@/bending/plan/layoutProblem";
import { partVariants } from "@/bending/plan/partVariants";
import { planPart } from "@/bending/plan/planPart";
import { readPlanDocument } from "@/bending/plan/readPlanDocument";
import { relaxedProblem } from "@/bending/plan/relaxedProblem";
import { createRuns } from "@/bending/setup/createRuns";
import { createStationMaker } from "@/bending/setup/createStationMaker";
import { NEAR_GAP_MM, placeStations } from "@/bending/setup/placeStations";
import { stationKinds } from "@/bending/setup/stationKinds";
import type { PlanRequest } from "@/bending/plan/planRequest";
import { planCorpus } from "./planCorpus";
import { verifyPlan } from "./verifyPlan";

// A plan takes long on a machine that is busy with other work.
vi.setConfig({ testTimeout: 180_000 });

const MADE = ["u", "z", "hat", "deep-u", "tray", "tabs", "corrugated-4", "no-radius", "tray-returns"];

/** The questions of the order search for a corpus part, with the first few pairs. */
function questions(request: PlanRequest, pairs: number) {
  const variants = partVariants(request);
  const variant = variants.ok ? variants.value[0] : undefined;
  if (!variant) throw new Error("the part builds");
  const found = candidatePairs(request.tools, request.machine, variant.part.thickness, variant.wantedV, "mm");
  const situation = createSituation({ variant, machine: request.machine, units: "mm", pairs: found.pairs.slice(0, pairs) });
  return { situation, checks: createStepChecks(situation), numbers: createGaugeNumbers() };
}

describe("plans of the corpus", () => {
  it.each(MADE)("%s: optimal, and an independent check finds nothing wrong", (name) => {
    const request = planCorpus(name);
    const plan = planPart(request);
    expect(plan.reasons).toEqual([]);
    expect(plan.status).toBe("optimal");
    expect(verifyPlan(plan, request)).toEqual([]);
    expect(plan.proof.bound).toBeCloseTo(plan.cost, 6);
    expect(plan.seconds.total).toBeCloseTo(plan.seconds.setup + plan.batch * plan.seconds.perPart, 5);
    expect(readPlanDocument(JSON.parse(JSON.stringify(plan)))).toEqual({ ok: true, value: plan });
    expect(planPart(request)).toEqual(plan);
  });

  it("plans ten bends, proven, and an independent check finds nothing wrong", () => {
    const request = planCorpus("corrugated-10");
    const plan = planPart(request);
    expect(plan.status).toBe("optimal");
    expect(plan.steps).toHaveLength(10);
    expect(plan.proof.bound).toBeCloseTo(plan.cost, 6);
    expect(verifyPlan(plan, request)).toEqual([]);
  });

  it.each(["u", "z", "hat", "deep-u", "tray", "tabs"])("%s: the search and every permutation agree, with and without the bed", (name) => {
    const request = planCorpus(name);
    const { situation, checks, numbers } = questions(request, 2);
    const pair = situation.pairs[0];
    if (!pair) throw new Error("a pair fits");
    const longest = Math.max(...situation.moves.map(({ halfLength }) => 2 * halfLength));
    const make = createStationMaker(() => pair, request.machine.settings);
    const beds = stationKinds([{ pair: 0, punch: pair.punch, die: pair.die, lineLength: longest }], createRuns(request.machine.settings))
      .flatMap((kind) => placeStations(make([kind]) ?? [], [NEAR_GAP_MM], request.machine)).slice(0, 2);
    expect(beds.length).toBeGreaterThan(0);
    for (const problem of [relaxedProblem(situation, checks, numbers), ...beds.map((bed) => layoutProblem(situation, checks, numbers, bed))]) {
      const slow = everyOrder(problem);
      const fast = searchOrder(problem);
      expect(fast.kind).toBe(slow === null ? "none" : "found");
      if (slow && fast.kind === "found") expect(fast.weight).toBeCloseTo(slow.weight, 6);
    }
  });

  it("needs a relieved punch for a deep narrow U", () => {
    const request = planCorpus("deep-u");
    expect(planPart(request).steps.map((step) => step.punch)).toContain("P88-relieved");
    const straight = planPart({ ...request, tools: request.tools.filter(({ id }) => id !== "P88-relieved") });
    expect(straight.status).toBe("infeasible");
    expect(straight.reasons.length).toBeGreaterThan(0);
    expect(straight.reasons[0]?.tools.length).toBeGreaterThan(0);
  });

  it("says why a closed section and a hem cannot be made, and still tells the flat", () => {
    for (const name of ["closed", "hem"]) {
      const plan = planPart(planCorpus(name));
      expect(plan.status).toBe("infeasible");
      expect(plan.reasons[0]?.bends.length).toBeGreaterThan(0);
      expect(plan.flat.width).toBeGreaterThan(0);
      expect(readPlanDocument(JSON.parse(JSON.stringify(plan))).ok).toBe(true);
    }
    expect(planPart(planCorpus("hem")).reasons[0]?.kind).toBe("hem");
  });

  it("forms two tabs on one line by one stroke", () => {
    expect(planPart(planCorpus("tabs")).order).toContain("tabLeft+tabRight");
  });
});

describe("a person's own order", () => {
  it("keeps to the order, costs no less than the best, and names the step that fails", () => {
    const request = planCorpus("hat");
    const best = planPart(request);
    const own = checkOrder({ ...request, order: [...best.order] });
    expect(own.order).toEqual(best.order);
    expect(own.cost).toBeCloseTo(best.cost, 6);
    const other = checkOrder({ ...request, order: ["b4", "b1", "b3", "b2"] });
    if (other.status === "optimal") expect(other.cost).toBeGreaterThanOrEqual(best.cost - 1e-6);
    else expect(other.reasons.length).toBeGreaterThan(0);
    const wrong = checkOrder({ ...request, order: ["b1", "b9"] });
    expect(wrong.reasons.map(({ message }) => message).join(" ")).toContain("b9");
  });
});

describe("laws of planning", () => {
  it("an extra tool never hurts: the plan with fewer tools costs no less, or there is none", () => {
    for (const name of ["u", "hat", "deep-u"]) {
      const request = planCorpus(name);
      const all = planPart(request);
      for (const tool of request.tools) {
        const fewer = planPart({ ...request, tools: request.tools.filter((one) => one !== tool) });
        if (fewer.status === "optimal" && fewer.cautions.length === all.cautions.length) expect(fewer.cost).toBeGreaterThanOrEqual(all.cost - 1e-6);
        if (all.status === "infeasible") expect(fewer.status).toBe("infeasible");
      }
    }
  });

  it("more clearance never makes a plan possible", () => {
    for (const name of ["u", "deep-u", "closed", "hat"]) {
      const request = planCorpus(name);
      const made = [0.5, 1, 4, 12, 30].map((clearance) => {
        const settings = { ...request.machine.settings, clearance: clearance as typeof request.machine.settings.clearance };
        return planPart({ ...request, machine: { ...request.machine, settings } }).status === "optimal";
      });
      expect(made).toEqual([...made].sort((a, b) => Number(b) - Number(a)));
    }
  });

  it("doubled times double the cost", () => {
    const request = planCorpus("hat");
    const times = Object.fromEntries(Object.entries(request.machine.times).map(([key, value]) => [key, 2 * value])) as unknown as typeof request.machine.times;
    const once = planPart(request);
    const twice = planPart({ ...request, machine: { ...request.machine, times } });
    expect(twice.cost).toBeCloseTo(2 * once.cost, 5);
    expect(twice.order).toEqual(once.order);
  });

  it("new names for tools change nothing but the names", () => {
    const request = planCorpus("hat");
    const renamed = planPart({ ...request, tools: request.tools.map((tool) => ({ ...tool, id: `zz ${tool.id}`, pieces: tool.pieces.map((piece) => ({ ...piece, id: `zz ${piece.id}` })) })) });
    const plain = planPart(request);
    expect(renamed.cost).toBe(plain.cost);
    expect(renamed.order).toEqual(plain.order);
    expect(renamed.steps.map(({ gauge }) => gauge)).toEqual(plain.steps.map(({ gauge }) => gauge));
    expect(renamed.steps[0]?.punch).toBe(`zz ${plain.steps[0]?.punch}`);
  });

  it("missing pieces are named, not covered up", () => {
    const request = planCorpus("u");
    const short = planPart({ ...request, tools: request.tools.map((tool) => (tool.kind === "punch" ? { ...tool, pieces: tool.pieces.filter(({ length }) => length < 60) } : tool)) });
    expect(short.status).toBe("infeasible");
    expect(short.reasons.every(({ kind }) => kind === "sections")).toBe(true);
  });

  it("stops when told to, without calling it impossible", () => {
    const plan = planPart({ ...planCorpus("tray"), shouldStop: () => true });
    expect(["unknown", "feasible"]).toContain(plan.status);
    if (plan.status === "unknown") expect(plan.reasons[0]?.kind).toBe("budget");
  });

  it("stopped at any moment it says what it has, with a bound that no plan goes below", () => {
    for (const name of ["hat", "tray"]) {
      const request = planCorpus(name);
      const best = planPart(request);
      const seen = new Set<string>();
      for (const after of [0, 3, 30, 100, 300, 1000, 3000, 10_000]) {
        let asked = 0;
        const plan = planPart({ ...request, shouldStop: () => (asked += 1) > after });
        seen.add(plan.status);
        expect(plan.proof.bound).toBeLessThanOrEqual(best.cost + 1e-6);
        if (plan.status === "unknown") { expect(plan.reasons[0]?.kind).toBe("budget"); continue; }
        expect(["feasible", "optimal"]).toContain(plan.status);
        expect(plan.cost).toBeGreaterThanOrEqual(best.cost - 1e-6);
        expect(plan.gap).toBeCloseTo((plan.cost - plan.proof.bound) / plan.cost, 6);
        expect(plan.status === "optimal").toBe(plan.gap === 0);
        expect(verifyPlan(plan, request)).toEqual([]);
      }
      expect(seen.size).toBeGreaterThan(1);
    }
  });

  it("says how far it is and asks whether to stop all the time, and ends soon after it is told to", () => {
    const messages = new Set<string>();
    let [asked, after] = [0, 0];
    planPart({
      ...planCorpus("tray-returns"),
      onProgress: ({ message }) => { messages.add(message); },
      shouldStop: () => {
        asked += 1;
        if (asked > 2000) after += 1;
        return asked > 2000;
      },
    });
    expect(messages.size).toBeGreaterThan(1);
    expect(after).toBeLessThan(100);
  });

  it("says over what it is proven: a shortlist of pairs where there are more, all of them where none clears", () => {
    const plan = planPart(planCorpus("hat"));
    expect(plan.proof.method).toMatch(/every order and front with (all \d+|\d+ of the \d+) tool pairs/);
    expect(planPart(planCorpus("closed")).proof.method).toMatch(/with all \d+ tool pairs that fit a bend.*none clears/);
    expect(checkOrder({ ...planCorpus("hat"), order: [...plan.order] }).proof.method).toContain("the order given");
  });

  it("works in the document's units", () => {
    const plan = planPart(planCorpus("no-radius"));
    expect(plan.units).toBe("in");
    expect((plan.steps[0]?.bendZ[1] ?? 0) - (plan.steps[0]?.bendZ[0] ?? 0)).toBeCloseTo(10, 5);
    expect(plan.flat.bends[0]?.source).not.toBe("");
    expect(mmPer(plan.units)).toBe(25.4);
  });
});
