import { describe, expect, it } from "vitest";
import { mm } from "@/bending/core/units";
import { materialById } from "@/bending/handbook/materials";
import type { PlanDocument } from "@/bending/plan/planDocument";
import { planPart } from "@/bending/plan/planPart";
import type { ShopNow, StoredPlan } from "@/bending/plan/storedPlan";
import { verifyStored } from "@/bending/plan/verifyStored";
import type { Machine } from "@/bending/tooling/machine";
import type { Tool } from "@/bending/tooling/tool";
import { planCorpus } from "./planCorpus";

function stored(name: string): { readonly stored: StoredPlan; readonly now: ShopNow } {
  const request = planCorpus(name);
  const plan = planPart(request);
  const material = materialById(request.document.material);
  if (!material) throw new Error("the material is known");
  return { stored: { plan, document: request.document, material, machine: request.machine, tools: request.tools }, now: { engine: plan.engine, machine: request.machine, tools: request.tools, missing: [] } };
}
const hat = stored("hat");
const tray = stored("tray");
const check = (now: Partial<ShopNow>, plan: Partial<PlanDocument> = {}, of = tray) => verifyStored({ ...of.stored, plan: { ...of.stored.plan, ...plan } }, { ...of.now, ...now });
const onMachine = (change: Partial<Machine>): Machine => ({ ...tray.now.machine, ...change });
const settings = (change: Partial<Machine["settings"]>) => onMachine({ settings: { ...tray.now.machine.settings, ...change } });
const firstPiece = tray.stored.plan.stations[0]!.punchSections.flatMap((section) => (section.length === undefined ? [] : section.piece ?? []))[0]!;
const used = new Set(tray.stored.plan.steps.flatMap(({ punch, die }) => [punch, die]));
const changedTools = (of: (tool: Tool) => Tool) => tray.now.tools.map((tool) => (used.has(tool.id) ? of(tool) : tool));

describe("a stored plan looked over again", () => {
  it.each([["hat", hat], ["tray", tray]] as const)("%s: holds in the shop that it was planned for", (_name, of) => {
    expect(check({}, {}, of)).toEqual({ holds: true, engine: { planned: of.stored.plan.engine, now: of.stored.plan.engine }, steps: of.stored.plan.steps.length, wrong: [], changed: [] });
  });

  it("says when the planner is newer, and holds all the same", () => {
    expect(check({ engine: "planner/9" })).toMatchObject({ holds: true, engine: { now: "planner/9" } });
  });

  it("names a piece that is withdrawn, one that was ground shorter, and a tool that is gone", () => {
    const gone = check({ missing: [{ piece: firstPiece, why: "withdrawn" }] });
    expect([gone.holds, gone.wrong]).toEqual([false, [{ step: null, reason: expect.objectContaining({ kind: "sections", message: expect.stringContaining(`${firstPiece} of`) }) }]]);
    expect(gone.wrong[0]?.reason.message).toContain("withdrawn");
    const shorter = check({ tools: changedTools((tool) => ({ ...tool, pieces: tool.pieces.map((piece) => (piece.id === firstPiece ? { ...piece, length: mm(piece.length - 2) } : piece)) })) });
    expect(shorter.wrong[0]?.reason.message).toMatch(/is .* long now, .* was planned/);
    const die = tray.stored.plan.steps[0]!.die;
    const without = check({ tools: tray.now.tools.filter(({ id }) => id !== die) });
    expect(without.wrong.map(({ reason }) => reason.kind)).toContain("no-die");
  });

  it("lists settings that changed, and fails only where a step does", () => {
    const slower = check({ machine: onMachine({ times: { ...tray.now.machine.times, flip: 99 } }) });
    expect([slower.holds, slower.changed]).toEqual([true, [{ what: "seconds for a flip", before: `${tray.now.machine.times.flip} s`, now: "99 s" }]]);
    const tight = check({ machine: settings({ clearance: mm(60) }) });
    expect(tight.changed.map(({ what }) => what)).toEqual(["clearance margin"]);
    expect(tight.wrong.find(({ step }) => step !== null)?.reason).toMatchObject({ evidence: { depth: expect.any(Number) } });
    const weak = check({ machine: onMachine({ maxForce: 1 as Machine["maxForce"] }) });
    expect(weak.wrong.map(({ reason }) => reason.kind)).toEqual(tray.stored.plan.steps.map(() => "force"));
  });

  it("fails a step whose load is farther from the middle than the machine bears today", () => {
    const far = Math.max(...tray.stored.plan.steps.map(({ bendZ }) => Math.abs(bendZ[0] + bendZ[1]) / 2));
    const weak = check({ machine: settings({ offCentre: [[mm(far - 1), 0.001]] }) });
    expect(weak.changed).toEqual([{ what: "force off the middle of the bed", before: "the same all along", now: expect.stringContaining("0.1 % at") }]);
    expect(weak.wrong.map(({ reason }) => [reason.kind, reason.message.includes("from the middle of the bed")])).toEqual(weak.wrong.map(() => ["force", true]));
    expect(weak.wrong.length).toBeGreaterThan(0);
    expect(check({ machine: settings({ offCentre: [[mm(far + 1), 0.9]] }) }).holds).toBe(true);
  });

  it("holds the gauge to its travel, the stations to the bed and the tangs to the machine", () => {
    const { gauge } = tray.now.machine;
    const near = check({ machine: onMachine({ gauge: { ...gauge, x: [gauge.x[0], mm(20)] } }) });
    expect(near.wrong.some(({ step, reason }) => step !== null && reason.kind === "gauge" && reason.message.includes("it travels from"))).toBe(true);
    expect(check({ machine: onMachine({ bedLength: mm(50) }) }).wrong.map(({ reason }) => reason.kind)).toContain("bed");
    expect(check({ machine: onMachine({ punchTang: "another" }) }).wrong[0]?.reason.message).toContain('takes the tang "another"');
  });

  it("does not trust the plan: another order, a bend left out, a station moved", () => {
    const { steps, stations } = tray.stored.plan;
    expect(check({}, { steps: steps.slice(1) }).wrong.some(({ reason }) => reason.message.includes("not every bend is made"))).toBe(true);
    expect(check({}, { steps: [...steps, steps[0]!] }).holds).toBe(false);
    expect(check({}, { stations: stations.map((station) => ({ ...station, from: station.from + 400, to: station.to + 400 })) }).wrong.map(({ reason }) => reason.kind)).toContain("sections");
  });
});
