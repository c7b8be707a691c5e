import { describe, expect, it, vi } from "vitest";
import { runCommand } from "@/bending/command/runCommand";
import type { CommandWorld } from "@/bending/command/outcome";
import { createClearance } from "@/bending/clearance/createClearance";
import { deg, toRad } from "@/bending/core/units";
import { buildPart } from "@/bending/part/buildPart";
import { plannedBends } from "@/bending/plan/plannedBends";
import type { PlanDocument } from "@/bending/plan/planDocument";
import { planPart } from "@/bending/plan/planPart";
import { waysOf } from "@/bending/plan/waysOf";
import { wishesOf } from "@/bending/plan/wishesOf";
import { sharedSetup } from "@/bending/setup/shared/sharedSetup";
import type { Die, Punch } from "@/bending/tooling/tool";
import { planCorpus } from "./planCorpus";
import { readFileSync } from "node:fs";

vi.setConfig({ testTimeout: 60_000 });

const NAMES = ["tray", "u", "hat"] as const;
const requests = NAMES.map((name) => planCorpus(name));
const plans = requests.map((request) => planPart(request));
/** A plan as it was stored before steps said what they need of a bed. */
const ofBefore = (plan: PlanDocument | undefined) => JSON.parse(JSON.stringify({ ...plan, steps: plan?.steps.map((step) => ({ ...step, room: undefined })) })) as PlanDocument;

describe("several plans on one bed", () => {
  it("holds every bend of every plan, and no tool on the bed stands where it must not", () => {
    const [request] = requests;
    const wishes = wishesOf(plans);
    if (!request || !wishes.ok) throw new Error("the corpus has plans");
    const setup = sharedSetup(wishes.value, request.tools, request.machine);
    expect(setup.status).toBe("optimal");
    expect(setup.stations.flatMap((station) => station.wishes.map(({ id }) => id)).sort()).toEqual(wishes.value.map(({ id }) => id).sort());
    expect(setup.stations.length).toBeLessThan(plans.reduce((sum, { stations }) => sum + stations.length, 0));
    const tool = (kind: string, id: string) => request.tools.find((one) => one.kind === kind && one.id === id);
    plans.forEach((plan, index) => {
      const asked = requests[index];
      const built = asked ? buildPart(asked.document, { materials: asked.materials, ...plannedBends(plan) }) : null;
      if (!asked || !built?.ok) throw new Error("the part builds");
      const part = built.value;
      const demanded = new Map(plan.steps.flatMap((step) => step.bends.map((id) => [id, step.demandedAngle] as const)));
      const clearance = createClearance(part, asked.machine, { demandedAngle: (bend) => toRad(deg(demanded.get(part.bends[bend]?.id ?? "") ?? 0)) });
      let formed = 0;
      for (const step of plan.steps) {
        const bends = step.bends.map((id) => part.bends.findIndex((bend) => bend.id === id));
        const hit = { bends, front: part.faces.findIndex(({ id }) => id === step.front), formed };
        const own = setup.stations.find((station) => station.wishes.some(({ id }) => id === `${plan.part}: ${step.bends.join("+")}`));
        const z = own?.wishes.find(({ id }) => id === `${plan.part}: ${step.bends.join("+")}`)?.z ?? NaN;
        expect([own?.punch, own?.die]).toEqual([step.punch, step.die]);
        for (const station of setup.stations) {
          for (const [kind, run] of [["punch", station.punchRun], ["die", station.dieRun]] as const) {
            const forbidden = clearance.forbidden(hit, tool("punch", step.punch) as Punch, tool("die", step.die) as Die, tool(kind, station[kind]) as Punch | Die);
            const [from, to] = [station.z - run.length / 2 - z, station.z + run.length / 2 - z];
            expect(forbidden.filter(([a, b]) => a < to - 1e-3 && b > from + 1e-3)).toEqual([]);
          }
        }
        for (const bend of bends) formed |= 1 << bend;
      }
    });
  });

  it("needs no more stations or tools when every tool that makes a step may", () => {
    const ways = plans.map((plan, index) => {
      const request = requests[index];
      const found = request ? waysOf({ ...request, plan }) : null;
      if (!found?.ok) throw new Error("the ways of a plan's own part");
      return found.value;
    });
    plans.forEach((plan, index) => plan.steps.forEach((step, at) => expect(ways[index]?.[at]).toContainEqual(expect.objectContaining({ punch: step.punch, die: step.die }))));
    const [own, any] = [wishesOf(plans), wishesOf(plans, ways)];
    const [request] = requests;
    if (!request || !own.ok || !any.ok) throw new Error("the corpus has plans");
    const [narrow, wide] = [own.value, any.value].map((wishes) => sharedSetup(wishes, request.tools, request.machine));
    expect(wide?.status).toBe("optimal");
    expect([wide?.stations.length, wide?.kinds].map(Number)).toEqual([expect.toSatisfy((count: number) => count <= (narrow?.stations.length ?? 0)), expect.toSatisfy((kinds: number) => (wide?.stations.length ?? 0) < (narrow?.stations.length ?? 0) || kinds <= (narrow?.kinds ?? 0))]);
    expect(any.value.some((wish) => wish.ways.length > 1)).toBe(true);
  });

  it("tells two of one part apart, and refuses a plan that cannot say what it needs", () => {
    const [plan] = plans;
    if (!plan) throw new Error("the corpus has plans");
    const twice = wishesOf([plan, plan]);
    expect(twice.ok && new Set(twice.value.map(({ id }) => id)).size).toBe(plan.steps.length * 2);
    expect(wishesOf([plan, ofBefore(plan)])).toMatchObject({ ok: false, error: [{ path: "[1].steps", message: expect.stringContaining("plan it again") }] });
  });
});

describe("the command line's setup", () => {
  const files = new Map<string, string>([
    ...plans.map((plan, index) => [`${NAMES[index] ?? ""}.plan.json`, JSON.stringify(plan)] as const),
    ["old.json", JSON.stringify(ofBefore(plans[0]))],
  ]);
  const world: CommandWorld = {
    now: () => 0,
    readBytes: () => ({ ok: false, error: "there is no such file" }),
    readText: (path) => {
      const text = files.get(path);
      if (text !== undefined) return { ok: true, value: text };
      return /^(tooling|machine|tray|u|hat)\.json$/.test(path) ? { ok: true, value: readFileSync(new URL(`plans/${path}`, import.meta.url), "utf8") } : { ok: false, error: "there is no such file" };
    },
  };
  const SHOP = ["--tooling", "tooling.json", "--machine", "machine.json"];

  it("prints one bed for several plans", () => {
    const { exitCode, json } = runCommand(["setup", "tray.plan.json", "u.plan.json", "hat.plan.json", ...SHOP], world);
    expect(exitCode).toBe(0);
    expect(json).toMatchObject({ status: "optimal", units: "mm", stations: [expect.objectContaining({ id: "A", bends: expect.anything(), punchRun: expect.objectContaining({ pieces: expect.anything() }) }), ...Array.from({ length: (json as { stations: unknown[] }).stations.length - 1 }, () => expect.anything())] });
  });

  it("takes other tools when the parts are named", () => {
    const { exitCode, json } = runCommand(["setup", "tray.plan.json", "u.plan.json", ...SHOP, "--parts", "tray.json,u.json"], world);
    expect([exitCode, json]).toEqual([0, expect.objectContaining({ status: "optimal" })]);
  });

  it.each([
    [["setup", "u.plan.json", ...SHOP, "--parts", "u.json,hat.json"], "--parts"],
    [["setup", "u.plan.json", ...SHOP, "--parts", "nowhere.json"], "nowhere.json"],
    [["setup", "tray.plan.json", ...SHOP, "--parts", "u.json"], "u.json: steps[0].bends"],
    [["setup", ...SHOP], "PLAN.json"],
    [["setup", "tray.plan.json", "nowhere.json", ...SHOP], "nowhere.json"],
    [["setup", "machine.json", ...SHOP], "machine.json: format"],
    [["setup", "u.plan.json", "old.json", ...SHOP], "old.json: steps"],
    [["setup", "u.plan.json", "--machine", "machine.json"], "--tooling"],
    [["setup", "u.plan.json", "--tooling", "tooling.json"], "--machine"],
    [["setup", "u.plan.json", ...SHOP, "--time-limit", "-1"], "--time-limit"],
    [["flat", "tray.plan.json", "u.plan.json"], "one file"],
  ])("leaves with 2 and one line that names the field: %j", (args, named) => {
    const { exitCode, error } = runCommand(args, world);
    expect(exitCode).toBe(2);
    expect(error).toContain(named);
  });
});
