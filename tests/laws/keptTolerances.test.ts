import { expect, test } from "vitest";
import { mmPer } from "@/bending/core/units";
import { documentInUnits } from "@/bending/part/documentInUnits";
import type { PlanDocument } from "@/bending/plan/planDocument";
import { planPart } from "@/bending/plan/planPart";
import { readPlanDocument } from "@/bending/plan/readPlanDocument";
import { planCorpus } from "../corpus/planCorpus";

const planned = (name: string, toleranceLength?: number): PlanDocument => {
  const request = planCorpus(name);
  return planPart({ ...request, document: { ...request.document, ...(toleranceLength === undefined ? {} : { toleranceLength }) } });
};
const worstLeg = ({ tolerances }: PlanDocument): number => Math.max(...(tolerances ?? []).filter(({ kind }) => kind === "leg").map(({ worstCase }) => worstCase ?? Infinity));
const said = ({ cautions }: PlanDocument): readonly string[] => cautions.filter(({ kind }) => kind === "tolerance").map(({ message }) => message);

test("a length that is asked for is gauged so that it is kept, where the nearest place to gauge from would not keep it", () => {
  const [free, asked] = [planned("u"), planned("u", 0.25)];
  expect(worstLeg(free)).toBeGreaterThan(0.25);
  expect(worstLeg(asked)).toBeLessThan(0.25);
  expect(said(asked)).toEqual([]);
  expect(asked.status).toBe("optimal");
  expect(asked.cost).toBeGreaterThanOrEqual(free.cost);
});

test("what is asked for generously changes nothing but what is said", () => {
  const [free, asked] = [planned("hat"), planned("hat", 5)];
  expect(asked.order).toEqual(free.order);
  expect(asked.cost).toBe(free.cost);
  expect(asked.steps).toEqual(free.steps);
  expect(said(asked)).toEqual([]);
});

test("what no order keeps is said, with the steps that bring it in", () => {
  const tight = planned("u", 0.05);
  expect(said(tight)).toHaveLength(3);
  for (const message of said(tight)) expect(message).toMatch(/±0\.05 mm is asked for; .*no order keeps it on this machine, since one stop alone is ±0\.10 mm/);
  const [web] = said(planned("u", 0.15));
  expect(web).toMatch(/^b1, bend to b2: ±0\.15 mm is asked for; it may miss by ±0\.2\d mm through steps 1, 2/);
});

test("is told in the document's units and reads back as it was written", () => {
  const request = planCorpus("z");
  const inches = planPart({ ...request, document: documentInUnits(request.document, "in") });
  const read = readPlanDocument(JSON.parse(JSON.stringify(inches)));
  expect(read.ok && read.value.tolerances).toEqual(inches.tolerances);
  const mm = planned("z").tolerances ?? [];
  expect(inches.tolerances).toHaveLength(mm.length);
  inches.tolerances?.forEach((one, i) => {
    expect(one.nominal * mmPer("in")).toBeCloseTo(mm[i]?.nominal ?? NaN, 3);
    expect((one.worstCase ?? NaN) * mmPer("in")).toBeCloseTo(mm[i]?.worstCase ?? NaN, 3);
  });
});

test("fingers at two depths on a slanted edge are a finding: the sheet can slide along it", () => {
  const plan = planPart({
    ...planCorpus("u"),
    document: {
      format: "part/1", name: "Slanted", units: "mm", material: "S235", thickness: 2, insideRadius: 2.6,
      base: { outline: [[0, 0], [200, 0], [200, 100], [0, 60]] }, flanges: [{ id: "front", on: "base", edge: 0, length: 150, startAngle: 70, endAngle: 88, angle: 90, direction: "up" }],
    },
  });
  const depths = plan.steps[0]?.gauge.fingers.map(({ x }) => x) ?? [];
  const slid = plan.cautions.filter(({ kind, message }) => kind === "gauge" && message.includes("slanted edge"));
  expect(depths).toHaveLength(2);
  expect(slid).toHaveLength(depths[0] === depths[1] ? 0 : 1);
});
