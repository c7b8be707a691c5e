import { describe, expect, it } from "vitest";
import type { PlanDocument, PlanStation, PlanStep } from "@/bending/plan/planDocument";
import { planPart } from "@/bending/plan/planPart";
import { verifyPlan } from "../corpus/verifyPlan";
import { lawRequests } from "./lawRequests";

const { request } = lawRequests(1).find(({ name }) => name === "tray") ?? { request: null };
if (request === null) throw new Error("the tray is one of the parts");
const plan = planPart(request);

const steps = (change: (step: PlanStep, index: number) => PlanStep): PlanDocument => ({ ...plan, steps: plan.steps.map(change) });
const stations = (change: (station: PlanStation, index: number) => PlanStation): PlanDocument => ({ ...plan, stations: plan.stations.map(change) });
const seconds = (change: Partial<PlanDocument["seconds"]>): PlanDocument => ({ ...plan, seconds: { ...plan.seconds, ...change } });
const [first, second] = [plan.stations[0]!, plan.stations[1]!];
const moved = (station: PlanStation, by: number): PlanStation => ({ ...station, from: station.from + by, to: station.to + by });

const DAMAGES: readonly (readonly [string, PlanDocument])[] = [
  ["less time for a part", seconds({ perPart: plan.seconds.perPart - 1, total: plan.seconds.total - 20 })],
  ["less time for the setup", seconds({ setup: plan.seconds.setup - 8, total: plan.seconds.total - 8 })],
  ["a total that is not the sum", seconds({ total: plan.seconds.total + 1 })],
  ["a cost that is not the total", { ...plan, cost: plan.cost - 1 }],
  ["a turn left out", steps((step) => ({ ...step, handling: { flip: false, turn: 0 } }))],
  ["a flip made up", steps((step) => ({ ...step, handling: { ...step.handling, flip: true } }))],
  ["a bend left out", { ...plan, steps: plan.steps.slice(0, -1) }],
  ["a bend made twice", { ...plan, steps: [...plan.steps, plan.steps[0]!] }],
  ["steps in another order", { ...plan, steps: [...plan.steps].reverse() }],
  ["the other front", steps((step) => ({ ...step, front: step.front === "base" ? step.bends[0]! : "base" }))],
  ["a station in another's place", stations((station, i) => (i === 0 ? moved(station, second.from - station.from) : station))],
  ["a station off the bed", stations((station, i) => (i === 0 ? moved(station, 5000) : station))],
  ["a step beside its station", steps((step, i) => (i === 0 ? { ...step, bendZ: [step.bendZ[0] + 40, step.bendZ[1] + 40] } : step))],
  ["a long run where a short one must be", { ...plan, steps: plan.steps.map((step) => ({ ...step, station: (first.to - first.from > second.to - second.from ? first : second).id })) }],
  ["a piece that is not there", stations((station) => ({ ...station, punchSections: station.punchSections.map((section) => (section.length === undefined ? section : { ...section, piece: "none" })) }))],
  ["a piece of another length", stations((station) => ({ ...station, dieSections: station.dieSections.map((section) => (section.length === undefined ? section : { ...section, length: section.length - 1 })) }))],
  ["one piece twice", stations((station) => ({ ...station, punchSections: first.punchSections }))],
  ["tools that the station does not have", steps((step) => ({ ...step, die: "V16" }))],
  ["half the force", steps((step) => ({ ...step, forceKN: step.forceKN / 2 }))],
  ["fingers that touch nothing", steps((step) => ({ ...step, gauge: { ...step.gauge, fingers: step.gauge.fingers.map((finger) => ({ ...finger, x: finger.x - 3 })) } }))],
  ["fingers too near each other", steps((step) => ({ ...step, gauge: { ...step.gauge, fingers: step.gauge.fingers.map((finger) => ({ ...finger, z: step.bendZ[0] })) } }))],
  ["fingers beyond their travel", steps((step) => ({ ...step, gauge: { ...step.gauge, fingers: step.gauge.fingers.map((finger) => ({ ...finger, r: 500 })) } }))],
];

describe("the looking over of a plan", () => {
  it("finds nothing wrong with a plan of two stations", () => {
    expect(plan.stations).toHaveLength(2);
    expect(verifyPlan(plan, request)).toEqual([]);
  });

  it.each(DAMAGES)("finds %s", (_, damaged) => {
    expect(verifyPlan(damaged, request)).not.toEqual([]);
  });

  it("finds what the machine or the stock no longer has", () => {
    const { machine } = request;
    expect(verifyPlan(plan, { ...request, tools: request.tools.map((tool) => ({ ...tool, pieces: tool.pieces.slice(1) })) })).not.toEqual([]);
    expect(verifyPlan(plan, { ...request, machine: { ...machine, maxForce: (machine.maxForce / 1000) as typeof machine.maxForce } })).not.toEqual([]);
    expect(verifyPlan(plan, { ...request, machine: { ...machine, punchTang: "another" } })).not.toEqual([]);
    expect(verifyPlan(plan, { ...request, machine: { ...machine, settings: { ...machine.settings, clearance: 30 as typeof machine.settings.clearance } } })).not.toEqual([]);
  });
});
