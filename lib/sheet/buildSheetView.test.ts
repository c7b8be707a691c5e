import { describe, expect, it } from "vitest";
import { buildSheetView } from "./buildSheetView";
import { channelPlan } from "./fixtures/channelPlan";
import { planModel } from "./planModel";
import { stepFrames } from "./stepFrames";
import { gaugedEdge } from "./gaugedEdge";

const view = buildSheetView({ ...channelPlan, part: { number: "RS-104", name: "Channel", revision: 3 }, sheet: { number: "S-0007" } });
const model = planModel(channelPlan);

describe("a setup sheet agrees with its plan", () => {
  it("has a row for every step, with the plan's own numbers", () => {
    expect(view.steps).toHaveLength(channelPlan.plan.steps.length);
    view.steps.forEach((row, index) => {
      const step = channelPlan.plan.steps[index];
      expect(Number(row.gaugeX)).toBeCloseTo(step?.gauge.x ?? NaN, 2);
      expect(Number(row.gaugeR)).toBeCloseTo(step?.gauge.r ?? NaN, 2);
      expect(row.fingers.map((finger) => Number(finger.z))).toEqual(step?.gauge.fingers.map((finger) => finger.z));
      expect(Number.parseFloat(row.demandedAngle)).toBeCloseTo(step?.demandedAngle ?? NaN, 1);
      expect([row.bends, row.front, row.punch, row.die, row.station]).toEqual([step?.bends.join(" + "), step?.front, step?.punch, step?.die, step?.station]);
    });
  });

  it("picks exactly the pieces that the stations name, with their rack places", () => {
    expect(view.pickList.map((line) => [line.piece, line.rack])).toEqual([["P86-100-1", "A3"], ["P86-30-1", "A4"], ["V16-130-1", "C1"]]);
  });

  it("stands the pieces end to end from the station's left end", () => {
    const [station] = view.bedMap.stations;
    expect(station?.pieces.map((piece) => [piece.id, piece.from, piece.to])).toEqual([["P86-100-1", -65, 35], ["P86-30-1", 35, 65], ["V16-130-1", -65, 65]]);
  });

  it("survives being stored as JSON", () => expect(JSON.parse(JSON.stringify(view))).toEqual(view));

  it("puts the cautions of every machine first and the plan's own among them", () => {
    expect(view.cautions[0]?.level).toBe("stop");
    expect(view.cautions.find((caution) => caution.text === "The edge at the gauge is short.")?.steps).toEqual([2]);
    expect(view.cautions.at(-1)?.text).toContain("advice");
  });

  it("measures legs and angles with the general tolerance when the document states none", () => {
    expect(view.measurements.find((entry) => entry.what === "Leg b1, outside")).toMatchObject({ nominal: "60.00 mm", tolerance: "±0.30 mm", low: "59.70 mm", source: "ISO 2768-1 m" });
    expect(view.measurements.filter((entry) => entry.kind === "angle")).toHaveLength(2);
  });
});

describe("the drawn machine agrees with the plan", () => {
  it("has the gauged edge at the gauge before the stroke", () => {
    for (const step of model.steps) {
      const edge = gaugedEdge(model, step, stepFrames(model, step, 0).frames);
      expect(edge?.map((corner) => corner[0])).toEqual(Array.from({ length: 4 }, () => expect.closeTo(step.gaugeX, 1)));
    }
  });

  it("has the punch go down into the die as the bend forms", () => {
    for (const step of model.steps) {
      const travel = stepFrames(model, step, 0).tipHeight - stepFrames(model, step, step.demanded).tipHeight;
      expect(travel).toBeGreaterThan(3);
      expect(travel).toBeLessThan(8);
    }
  });

  it("writes inches when the plan is in inches", () => {
    const inches = buildSheetView({
      ...channelPlan,
      plan: { ...channelPlan.plan, units: "in", steps: channelPlan.plan.steps.map((step) => ({ ...step, bendZ: [-60 / 25.4, 60 / 25.4], gauge: { ...step.gauge, x: step.gauge.x / 25.4 } })) },
      part: { number: "RS-104", name: "Channel", revision: 3 }, sheet: { number: "S-0007" },
    });
    expect(inches.steps[0]?.gaugeX).toBe("3.700");
    expect(inches.steps[0]?.bendZ).toBe("-2.36 to +2.36");
  });
});
