import { describe, expect, it, vi } from "vitest";
import { mm } from "@/bending/core/units";
import { planPart } from "@/bending/plan/planPart";
import type { PlanRequest } from "@/bending/plan/planRequest";
import { planCorpus } from "../corpus/planCorpus";
import { verifyPlan } from "../corpus/verifyPlan";
import { exhaustivePlan } from "./exhaustive/exhaustivePlan";
import { planDemerits } from "./planDemerits";

vi.setConfig({ testTimeout: 180_000 });

/** mm. Gaps between stations that are tried: as near as a hand needs, and on in steps to where a sheet of the corpus no longer reaches. */
const GAPS = [100, 110, 120, 140, 160, 180, 200, 240, 280, 320, 360];

/** Parts, the lengths of the pieces in service (alike for every tool unless said), and what is ruled out to keep the trying short. */
const SMALL: readonly { readonly name: string; readonly pieces: readonly number[] | Readonly<Record<string, readonly number[]>>; readonly tools?: readonly string[]; readonly batch?: number; readonly gaps?: readonly number[]; /** Seconds that a plan may be above, for stations a millimetre or so off their nearest place. */ readonly slack?: number }[] = [
  { name: "u", pieces: [415, 200, 100] },
  { name: "z", pieces: [415, 200, 100] },
  { name: "deep-u", pieces: [415, 200] },
  { name: "hat", pieces: [300, 200] },
  { name: "closed", pieces: [300], tools: ["P88", "P88-relieved", "V12"] },
  { name: "corrugated-4", pieces: [300, 200] },
  { name: "corrugated-6", pieces: [300], tools: ["P88", "V12", "V16"] },
  { name: "tabs", pieces: [200, 90], tools: ["P88", "V12"] },
  { name: "tray", pieces: [220, 140] },
  { name: "tray", pieces: { P88: [220], "P88-relieved": [140], V12: [220, 140] }, tools: ["P88", "P88-relieved", "V12"] },
  { name: "tray", pieces: [200, 140, 20], tools: ["P88", "V12"], batch: 1 },
  { name: "small/chain-3", pieces: [200, 100] },
  { name: "small/chain-5", pieces: [200, 100], tools: ["P88", "V12", "V16"] },
  { name: "small/chain-6", pieces: [200], tools: ["P88", "P88-relieved", "V12"] },
  { name: "small/chain-7", pieces: [200], tools: ["P88", "V12"] },
  { name: "small/tray-return", pieces: [160, 100], tools: ["P88", "V12"] },
  { name: "small/z-tabs", pieces: [150, 60], tools: ["P88", "V12"] },
  { name: "small/bracket", pieces: [110, 75, 20], tools: ["P88", "V12", "V16"], batch: 1 },
  { name: "small/up-down", pieces: [120, 70], tools: ["P88", "V12"] },
  // The sheet hangs over the next station: how near it may stand decides.
  { name: "small/wide-tab", pieces: [70, 55], tools: ["P88", "V12"], gaps: [100, 150, ...Array.from({ length: 16 }, (_, i) => 168 + i), 200, 250, 300], slack: 0.05 },
  { name: "small/batch", pieces: [120, 60], tools: ["P88", "V12"], batch: 1 },
  { name: "small/batch", pieces: [120, 60], tools: ["P88", "V12"], batch: 1000 },
];

function asked({ name, pieces, tools = ["P88", "P88-relieved", "V12", "V16"], batch = 20 }: (typeof SMALL)[number]): PlanRequest {
  const request = planCorpus(name, batch);
  const lengths = (id: string): readonly number[] => (Array.isArray(pieces) ? pieces as readonly number[] : (pieces as Readonly<Record<string, readonly number[]>>)[id] ?? []);
  return {
    ...request,
    // Runs are solid here: how far pieces may be drawn apart is not part of what is tried.
    machine: { ...request.machine, settings: { ...request.machine.settings, maxSectionGap: mm(0) } },
    tools: request.tools.filter(({ id }) => tools.includes(id)).map((tool) => ({ ...tool, pieces: lengths(tool.id).map((length, i) => ({ id: `${tool.id}/${i}`, length: mm(length), horn: null, rack: null })) })),
  };
}

describe("the plan is as good as the best of everything tried", () => {
  it.each(SMALL)("$name with $pieces, $batch", (one) => {
    const request = asked(one);
    const plan = planPart(request);
    const best = exhaustivePlan(request, 2, one.gaps ?? GAPS);
    expect(plan.status).toBe(best === null ? "infeasible" : "optimal");
    if (best === null) return;
    expect(planDemerits(plan)).toBe(best.demerits);
    expect(plan.cost).toBeGreaterThanOrEqual(best.seconds - 1e-5);
    expect(plan.cost).toBeLessThanOrEqual(best.seconds + (one.slack ?? 1e-5));
    expect(verifyPlan(plan, request)).toEqual([]);
  });

  it("tries beds of two tools and of two stations, and parts that no bed makes", () => {
    const seen = SMALL.filter(({ name }) => name === "tray").map((one) => planPart(asked(one)));
    expect(seen.map(({ stations }) => stations.length)).toEqual([2, 2, 2]);
    expect(new Set(seen[1]?.stations.map(({ punch }) => punch)).size).toBe(2);
  });
});
