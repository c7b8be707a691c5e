import { describe, expect, it, vi } from "vitest";
import { searchLearning } from "@/bending/order/searchLearning";
import { candidatePairs } from "@/bending/plan/candidatePairs";
import { createSituation } from "@/bending/plan/createSituation";
import { createStepChecks } from "@/bending/plan/createStepChecks";
import { createGaugeNumbers } from "@/bending/plan/gaugeNumbers";
import { partVariants } from "@/bending/plan/partVariants";
import { relaxedProblem } from "@/bending/plan/relaxedProblem";
import { planCorpus } from "./planCorpus";

vi.setConfig({ testTimeout: 120_000 });

function problemOf(name: string, pairs: number) {
  const request = planCorpus(name);
  const variants = partVariants(request);
  const variant = variants.ok ? variants.value[0] : undefined;
  if (!variant) throw new Error("the part builds");
  const found = candidatePairs(request.tools, request.machine, variant.part.thickness, variant.wantedV, "mm");
  const situation = createSituation({ variant, machine: request.machine, units: "mm", pairs: found.pairs.slice(0, pairs) });
  return relaxedProblem(situation, createStepChecks(situation), createGaugeNumbers());
}

describe("what is known of a step without asking", () => {
  it.each([["u", 4], ["hat", 4], ["deep-u", 2], ["tabs", 2], ["tray", 4], ["corrugated-6", 2]] as const)("%s: is never more than the answer, before and after a search has learned", (name, pairs) => {
    const [asked, searched] = [problemOf(name, pairs), problemOf(name, pairs)];
    searchLearning(searched, {});
    expect(searched.learned()).toBeGreaterThan(0);
    for (let formed = 0; formed < 2 ** asked.bends - 1; formed += 1) {
      asked.moves.forEach(({ mask }, move) => {
        if (mask & formed) return;
        const known = [asked, searched].map((problem) => problem.least(move, formed));
        const answer = asked.option(move, formed, 0);
        for (const least of answer === null ? [] : known) {
          expect(least?.demerit).toBeLessThanOrEqual(answer?.demerit ?? 0);
          // A step with more unmet wishes than the least may stand anywhere: one wish outweighs every gauge move.
          if (least?.gauges && least.demerit === answer?.demerit) expect(least.gauges).toContain(answer.gauge);
        }
      });
    }
  });
});
