import { describe, expect, it } from "vitest";
import { materialById } from "@/bending/handbook/materials";
import type { PartDocument } from "@/bending/part/partDocument";
import { planPart } from "@/bending/plan/planPart";
import { readPlanDocument } from "@/bending/plan/readPlanDocument";
import type { PlanRequest } from "@/bending/plan/planRequest";
import type { BendTrial } from "@/bending/shopTable/bendTrial";
import { shopTable } from "@/bending/shopTable/shopTable";
import { planCorpus } from "./planCorpus";
import { verifyPlan } from "./verifyPlan";

const corpus = planCorpus("u");
const trial = (vOpening: number, deduction: number): BendTrial => ({
  id: `V${vOpening}`, units: "mm", material: "S235", batch: "", thickness: 2, vOpening, punchRadius: 0.8, angle: 90, flanges: [60, 40], blankLength: 100 - deduction, measuredOn: "2026-11-30",
  instruments: { length: { uncertainty: 0.03, resolution: 0.01 }, angle: { uncertainty: 0.1, resolution: 0 } },
});
const table = (...trials: readonly BendTrial[]) => shopTable(trials, materialById);
const withoutRadius = Object.fromEntries(Object.entries(corpus.document).filter(([key]) => key !== "insideRadius")) as unknown as PartDocument;
const dies = (...names: readonly string[]) => corpus.tools.filter((tool) => tool.kind === "punch" || names.includes(tool.id));
const both = table(trial(12, 3.7), trial(16, 4.0));

function planned(changes: Partial<PlanRequest>) {
  const request = { ...corpus, ...changes };
  const plan = planPart(request);
  expect(verifyPlan(plan, request)).toEqual([]);
  expect(readPlanDocument(JSON.parse(JSON.stringify(plan)))).toMatchObject({ ok: true });
  return { plan, die: plan.steps[0]?.die, flat: plan.flatLength, from: plan.flat.bends.map(({ basis }) => [basis?.kind, basis?.shop?.vOpening, basis?.shop?.openingFrom]) };
}
const twice = <T>(value: T) => [value, value];

describe("a plan with the shop's bend table", () => {
  it("has the flat of the die that it bends on: another V, another flat", () => {
    const on12 = planned({ document: withoutRadius, tools: dies("V12"), shopTable: both });
    const on16 = planned({ document: withoutRadius, tools: dies("V16"), shopTable: both });
    expect([on12.flat, on16.flat]).toEqual([expect.closeTo(180 - 2 * 3.7, 4), expect.closeTo(180 - 2 * 4.0, 4)]);
    expect([on12.from, on16.from]).toEqual([twice(["shop", 12, "die"]), twice(["shop", 16, "die"])]);
  });

  it("asks for the die's V also where the document gives the radius, the nearest to that radius first", () => {
    expect(planned({ shopTable: both })).toMatchObject({ die: "V12", flat: expect.closeTo(172.6, 4), from: twice(["shop", 12, "die"]) });
    expect(planned({ shopTable: both, tools: dies("V16") })).toMatchObject({ die: "V16", flat: expect.closeTo(172, 4), from: twice(["shop", 16, "die"]) });
    expect(planned({ shopTable: table(trial(16, 4)) })).toMatchObject({ die: "V12", flat: expect.closeTo(172.325, 2), from: twice(["handbook", undefined, undefined]) });
  });

  it("is the same as ever where the shop has measured nothing that fits, or the document names a rule", () => {
    const { plan } = planned({});
    const elsewhere = table({ ...trial(12, 3.7), angle: 45, blankLength: 99 });
    for (const changes of [{ shopTable: table() }, { shopTable: elsewhere }]) expect({ ...planned(changes).plan, elapsedMs: 0 }).toEqual({ ...plan, elapsedMs: 0 });
    const ruled = planned({ shopTable: both, document: { ...corpus.document, rule: "din6935" } });
    expect([ruled.flat, ruled.plan.order, ruled.from]).toEqual([plan.flatLength, plan.order, twice(["handbook", undefined, undefined])]);
    expect(ruled.plan.flat.bends[0]?.basis?.next).toMatchObject({ kind: "shop" });
  });
});
