import { describe, expect, it } from "vitest";
import { deg, mm, toRad } from "@/bending/core/units";
import { candidatePairs } from "@/bending/plan/candidatePairs";
import { checkOrder } from "@/bending/plan/checkOrder";
import { createSituation } from "@/bending/plan/createSituation";
import { neighboursBesideFingers } from "@/bending/plan/neighboursBesideFingers";
import { partVariants } from "@/bending/plan/partVariants";
import { planPart } from "@/bending/plan/planPart";
import type { PlanRequest } from "@/bending/plan/planRequest";
import { readPlanDocument } from "@/bending/plan/readPlanDocument";
import { readPartDocument } from "@/bending/part/readPartDocument";
import { hemDieProfile } from "@/bending/tooling/hemDieProfile";
import { readToolingDocument } from "@/bending/tooling/readToolingDocument";
import { straightPunchProfile } from "@/bending/tooling/straightPunchProfile";
import { planCorpus } from "../corpus/planCorpus";

const slot = { floor: mm(44), back: mm(6), opening: mm(20) };
const sections = [{ length: 300, count: 2 }, { length: 100, count: 2 }];

function hemTools(change: Partial<typeof slot> = {}) {
  const shape = { vOpening: mm(8), vAngle: toRad(deg(26)), shoulderRadius: mm(0.8), height: mm(90), bodyWidth: mm(50) };
  const read = readToolingDocument({
    format: "tooling/1", units: "mm",
    tools: [
      { id: "P26", kind: "punch", profile: straightPunchProfile({ tipAngle: toRad(deg(26)), tipRadius: mm(0.6), height: mm(120), bodyWidth: mm(20) }), tipAngle: 26, tipRadius: 0.6, height: 120, maxForcePerMetre: 600, tang: "20 mm", sections },
      { id: "H8", kind: "die", profile: hemDieProfile(shape, { ...slot, ...change }), vOpening: 8, vAngle: 26, shoulderRadius: 0.8, height: 90, maxForcePerMetre: 600, tang: "60 mm", sections, flattening: { ...slot, ...change } },
    ],
  });
  if (!read.ok) throw new Error(JSON.stringify(read.error));
  return read.value;
}

/** A strip of 1 mm steel with a hem on one end and a flange on the other. */
function hemmed(leg: number, flange: number, change: Partial<typeof slot> = {}, depth = 80): PlanRequest {
  const read = readPartDocument({
    format: "part/1", name: "Hemmed strip", units: "mm", material: "S235", thickness: 1, insideRadius: 1.3,
    base: { outline: [[0, 0], [200, 0], [200, depth], [0, depth]] },
    flanges: [
      { id: "hem", on: "base", edge: 0, length: leg, angle: 180, direction: "up", hem: "closed" },
      { id: "wall", on: "base", edge: 2, length: flange, angle: 90, direction: "up" },
    ],
  });
  if (!read.ok) throw new Error(JSON.stringify(read.error));
  const corpus = planCorpus("u", 1);
  return { ...corpus, document: read.value, tools: [...corpus.tools, ...hemTools(change)] };
}

describe("a hem on a two-stage die", () => {
  it("takes an acute stroke and a flattening one, both in its own station, the sheet in the operator's hands", () => {
    const plan = planPart(hemmed(14, 20));
    expect(plan.reasons).toEqual([]);
    expect(plan.status).toBe("optimal");
    const step = plan.steps.find(({ bends }) => bends.includes("hem"));
    expect(step).toMatchObject({ punch: "P26", die: "H8", front: "base", angle: 180, acuteAngle: 150 });
    expect(step?.demandedAngle).toBeGreaterThan(150);
    expect(step?.demandedAngle).toBeLessThanOrEqual(180 - 26);
    expect(readPlanDocument(JSON.parse(JSON.stringify(plan))).ok).toBe(true);
  });

  it("costs one stroke more than its steps", () => {
    const request = hemmed(14, 20);
    const { machine } = request;
    const longer = { ...request, machine: { ...machine, times: { ...machine.times, stroke: machine.times.stroke + 1 } } };
    const [one, other] = [planPart(request), planPart(longer)];
    expect(other.seconds.perPart - one.seconds.perPart).toBeCloseTo(one.steps.length + 1, 6);
  });

  it("is refused with the reason where no die flattens, where the leg is too wide for the slot, and where it stands too high", () => {
    const corpus = planCorpus("u", 1);
    const bare = planPart({ ...hemmed(14, 20), tools: corpus.tools });
    expect([bare.status, bare.reasons[0]?.kind]).toEqual(["infeasible", "hem"]);
    expect(planPart(hemmed(60, 20)).reasons.map(({ message }) => message).join()).toMatch(/stands .* high after the acute stroke; the slot of H8 opens 20 mm/);
    expect(planPart(hemmed(36, 20, { opening: mm(24), floor: mm(50) })).reasons.map(({ message }) => message).join()).toMatch(/the slot of H8 is 31 mm deep/);
  });

  it("has no room for a wall that hangs down into the die in front of the slot", () => {
    // Turned down, the wall hangs under the sheet in front of the slot, which is 31 mm deep: it must be farther off than that.
    const down = (depth: number): PlanRequest => {
      const request = hemmed(14, 20, {}, depth);
      const document = request.document;
      if (!("flanges" in document) || document.flanges === undefined) throw new Error("the strip has flanges");
      return { ...request, document: { ...document, flanges: document.flanges.map((flange) => (flange.id === "wall" ? { ...flange, direction: "down" as const } : flange)) } };
    };
    expect(checkOrder({ ...down(40), order: ["wall", "hem"] }).status).toBe("optimal");
    const late = checkOrder({ ...down(28), order: ["wall", "hem"] });
    expect(late.status).toBe("infeasible");
    expect(late.reasons.flatMap(({ bends }) => bends)).toContain("hem");
  });
});

describe("a finger beside another station", () => {
  const request = hemmed(14, 20);
  const variants = partVariants(request);
  const variant = variants.ok ? variants.value[0] : undefined;
  if (!variant) throw new Error("the part builds");
  const { pairs } = candidatePairs(request.tools, request.machine, variant.part.thickness, variant.wantedV, "mm");
  const situation = createSituation({ variant, machine: request.machine, units: "mm", pairs });
  const place = (punch: string, die: string, z: number) => {
    const pair = situation.pairs.find((one) => one.punch.id === punch && one.die.id === die);
    if (!pair) throw new Error(`no ${punch} with ${die}`);
    return { pair: pair.index, z, punch: { pieces: [], gap: 0, length: 100 }, die: { pieces: [], gap: 0, length: 100 } };
  };
  const at = (x: number, other: readonly [string, string]) => {
    const own = place("P88", "V12", 0);
    const option = { x, slope: 0, r: 0, on: "edge" as const, face: 0, edge: 0, free: [[-200, 200]] as const };
    return neighboursBesideFingers(situation, { stations: [own, place(...other, 150)], setupSeconds: 0 }, own, option, 10);
  };
  const half = request.machine.gauge.fingerWidth / 2;

  it("keeps off a die that stands higher, 25 mm to the back, where it would stand over it", () => {
    expect(at(15, ["P26", "H8"])).toContainEqual([100 - half - 10, 200 + half - 10]);
    expect(at(26, ["P26", "H8"])).toEqual([]);
  });

  it("passes over a die of its own height", () => {
    expect(at(15, ["P88", "V16"])).toEqual([]);
  });
});

describe("the slot of a hem die", () => {
  it("must be open in the profile", () => {
    expect(() => hemTools()).not.toThrow();
    const shape = { vOpening: mm(8), vAngle: toRad(deg(26)), shoulderRadius: mm(0.8), height: mm(90), bodyWidth: mm(50) };
    const read = readToolingDocument({
      format: "tooling/1", units: "mm",
      tools: [{ id: "H8", kind: "die", profile: hemDieProfile(shape, slot), vOpening: 8, vAngle: 26, shoulderRadius: 0.8, height: 90, maxForcePerMetre: 600, tang: "60 mm", sections, flattening: { floor: 70, back: 6, opening: 20 } }],
    });
    expect(read.ok ? [] : read.error.map(({ path }) => path)).toEqual(["tools[0].flattening.back"]);
  });
});
