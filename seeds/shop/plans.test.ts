import { describe, expect, it } from "vitest";
import { materialById } from "@/bending/handbook/materials";
import { checkOrder } from "@/bending/plan/checkOrder";
import { planPart } from "@/bending/plan/planPart";
import { readMachineDocument } from "@/bending/tooling/readMachineDocument";
import { readToolingDocument } from "@/bending/tooling/readToolingDocument";
import { verifyPlan } from "../../tests/corpus/verifyPlan";
import { mustRead } from "../mustRead";
import { largeBrake } from "./machines";
import { parts } from "./parts";
import { tooling } from "./tools";
import { pieceStates } from "./tools/pieceStates";

const machine = mustRead("brake", readMachineDocument(largeBrake));
const inService = mustRead("tooling", readToolingDocument(tooling)).map((tool) => ({
  ...tool,
  pieces: tool.pieces.filter((piece) => (pieceStates[piece.id]?.state ?? "at brake") === "at brake"),
}));
const dies = ["V8-88-H60", "V12-88-H60"];
const straight = ["P88-R0.8-H120", "P88-R0.8-H150", ...dies];
const relieved = ["PR88-R0.8-H150", "PD88-R0.8-H200", ...dies];

function requestFor(number: string, codes?: readonly string[]) {
  const part = parts.find((candidate) => candidate.number === number);
  if (!part) throw new Error(`there is no part ${number}`);
  return { document: part.document, materials: materialById, tools: codes ? inService.filter((tool) => codes.includes(tool.id)) : inService, machine, batch: 10 };
}

describe("the demonstration's parts on the large brake, with the shop's own tools", () => {
  it.each(["RS-101", "RS-104", "RS-105", "RS-106", "RS-108"])("finds the best plan of %s among all tools", (number) => {
    const plan = planPart(requestFor(number));
    expect(plan.reasons).toEqual([]);
    expect(plan.status).toBe("optimal");
  });

  it("bends the tray with straight punches", () => {
    expect(planPart(requestFor("RS-102", straight))).toMatchObject({ status: "optimal", reasons: [] });
  });

  it("bends the battery box on two stations: a short one between the tabs, a long one", () => {
    const request = requestFor("RS-103");
    const plan = planPart(request);
    expect(plan).toMatchObject({ status: "optimal", reasons: [] });
    expect(plan.stations).toHaveLength(2);
    expect(plan.proof.bound).toBeCloseTo(plan.cost, 6);
    expect(verifyPlan(plan, request)).toEqual([]);
  });

  it("cannot bend the door with straight punches alone, and says where", () => {
    const plan = planPart(requestFor("RS-107", straight));
    expect(plan.status).toBe("infeasible");
    expect(plan.reasons.some((reason) => reason.kind === "clearance")).toBe(true);
  });

  it("bends the door with relieved punches", () => {
    const plan = planPart(requestFor("RS-107", relieved));
    expect(plan.status).toBe("optimal");
    expect(plan.steps.find((step) => step.bends.includes("hingeSide"))?.punch).toMatch(/^P[RD]88/);
  });

  it("lets the battery box be bent tabs first, the tabbed walls last, on two stations", () => {
    const order = ["frontRightTab", "frontLeftTab", "backRightTab", "backLeftTab", "left", "right", "front", "back"];
    const plan = checkOrder({ ...requestFor("RS-103", straight), order });
    expect(plan.status).toMatch(/^(optimal|feasible)$/);
    expect(plan.stations).toHaveLength(2);
  });
});
