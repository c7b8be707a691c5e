import { expect, it } from "vitest";
import { planPart } from "@/bending/plan/planPart";
import { planCorpus } from "../corpus/planCorpus";

it("the shop's factor of the air-bend force multiplies every stroke's force, and what no tool stands is refused", () => {
  const request = planCorpus("z");
  const [plain, own] = [planPart(request), planPart({ ...request, airForceFactor: 1.25 })];
  expect(own.steps.map(({ bends }) => bends)).toEqual(plain.steps.map(({ bends }) => bends));
  own.steps.forEach(({ forceKN }, index) => expect(forceKN).toBeCloseTo((plain.steps[index]?.forceKN ?? NaN) * 1.25, 2));
  expect(planPart({ ...request, airForceFactor: 1000 })).toMatchObject({ status: "infeasible", reasons: [expect.objectContaining({ kind: expect.stringContaining("force") })] });
});
