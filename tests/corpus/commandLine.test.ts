import { readFileSync } from "node:fs";
import { describe, expect, it, vi } from "vitest";
import { runCommand } from "@/bending/command/runCommand";
import type { CommandWorld } from "@/bending/command/outcome";
import type { PlanDocument } from "@/bending/plan/planDocument";

vi.setConfig({ testTimeout: 120_000 });

const extra: Record<string, string> = {
  "broken.json": "{",
  "thin.json": JSON.stringify({ format: "part/1", name: "T", units: "mm", material: "S235", thickness: 0, profile: { width: 100, legs: [40, 40], bends: [{ angle: 90, direction: "up" }] } }),
  "wood.json": JSON.stringify({ format: "part/1", name: "T", units: "mm", material: "oak", thickness: 2, profile: { width: 100, legs: [40, 40], bends: [{ angle: 90, direction: "up" }] } }),
  "shortLeg.json": JSON.stringify({ format: "part/1", name: "T", units: "mm", material: "S235", thickness: 2, insideRadius: 2, profile: { width: 100, legs: [40, 5], bends: [{ angle: 90, direction: "up" }] } }),
  "bends.json": bendTable({}),
  "wrongBends.json": bendTable({ blankLength: 200 }),
};

function bendTable(changes: object): string {
  const trial = { material: "S235", thickness: 2.01, vOpening: 12, punchRadius: 0.8, angle: 90, blankLength: 96.3, flanges: [60.05, 40.05], measuredOn: "2026-11-30", ...changes };
  const v20 = { ...trial, vOpening: 20, blankLength: 95.7 };
  return JSON.stringify({ format: "bend-table/1", units: "mm", instruments: { length: { uncertainty: 0.03, resolution: 0.01 }, angle: { uncertainty: 0.1 } }, trials: [trial, v20] });
}

const world: CommandWorld = {
  now: () => 0,
  readBytes: () => ({ ok: false, error: "there is no such file" }),
  readText: (path) => {
    if (extra[path] !== undefined) return { ok: true, value: extra[path] };
    try {
      return { ok: true, value: readFileSync(new URL(`plans/${path}`, import.meta.url), "utf8") };
    } catch {
      return { ok: false, error: "there is no such file" };
    }
  },
};

interface Judged {
  readonly findings: readonly { readonly rule: string; readonly severity: string; readonly cure?: object }[];
  readonly findingsLeftOut: readonly string[];
}
const SHOP = ["--tooling", "tooling.json", "--machine", "machine.json"];

describe("the command line", () => {
  it("prints the flat of a profile", () => {
    const { exitCode, json, error } = runCommand(["flat", "u.json"], world);
    expect([exitCode, error]).toEqual([0, null]);
    expect((json as { flatLength: number }).flatLength).toBeCloseTo(172.325, 2);
  });

  it("takes the shop's own bend table, and says so", () => {
    const { json } = runCommand(["flat", "u.json", "--bend-table", "bends.json"], world);
    const flat = json as { readonly flatLength: number; readonly bends: readonly { readonly deduction: number; readonly source: string; readonly basis: object }[] };
    const without = runCommand(["flat", "u.json"], world).json as { readonly flatLength: number };
    expect(flat.bends.map(({ source }) => source)).toEqual(["shop value of 1 trial", "shop value of 1 trial"]);
    // Measured 3.8 at 2.01 mm; at 2 mm of the same K a hundredth of the thickness less.
    expect(flat.bends[0]?.deduction).toBeCloseTo(3.8, 1);
    expect(flat.flatLength).toBeCloseTo(180 - 2 * (flat.bends[0]?.deduction ?? NaN), 4);
    expect(flat.bends[0]?.basis).toMatchObject({ kind: "shop", shop: { vOpening: 12, openingFrom: "radius", count: 1 }, next: { text: "DIN 6935", deduction: expect.closeTo((180 - without.flatLength) / 2, 3) } });
  });

  it("says with the flat what is wrong with the part, and with tools and a machine what the shop cannot do", () => {
    const blind = runCommand(["flat", "shortLeg.json"], world).json as Judged;
    expect(blind.findings.map(({ rule, severity, cure }) => [rule, severity, cure])).toEqual([["flange", "caution", { path: "profile.legs[1]", value: 8.5 }], ["radius", "caution", { path: "insideRadius", value: 2.5 }]]);
    expect(blind.findingsLeftOut).toHaveLength(1);
    const seeing = runCommand(["flat", "shortLeg.json", ...SHOP], world).json as Judged;
    expect(seeing.findings[0]).toMatchObject({ rule: "flange", severity: "stop", unit: "mm", value: 5 });
    expect(seeing.findingsLeftOut).toEqual([]);
    expect(runCommand(["flat", "shortLeg.json", "--tooling", "nowhere.json"], world).exitCode).toBe(2);
  });

  it("plans, checks the same order, and leaves with 3 when there is none", () => {
    const plan = runCommand(["plan", "hat.json", ...SHOP, "--batch", "5"], world);
    expect(plan.exitCode).toBe(0);
    const order = (plan.json as PlanDocument).order.join(",");
    const check = runCommand(["check", "hat.json", ...SHOP, "--order", order, "--batch=5"], world);
    expect((check.json as PlanDocument).cost).toBe((plan.json as PlanDocument).cost);
    const none = runCommand(["plan", "closed.json", ...SHOP], world);
    expect(none.exitCode).toBe(3);
    expect((none.json as PlanDocument).reasons.length).toBeGreaterThan(0);
  });

  it("says where an own order fails; with --why the least changes, with --robustness how firm a plan is", () => {
    const failing = runCommand(["check", "hat.json", ...SHOP, "--order", "b2,b3,b1,b4"], world);
    expect([failing.exitCode, (failing.json as PlanDocument).firstFailure]).toEqual([3, expect.objectContaining({ done: ["b2", "b3"], step: 3 })]);
    const why = runCommand(["plan", "shortLeg.json", ...SHOP, "--why"], world);
    expect([why.exitCode, (why.json as PlanDocument).changes?.map(({ kind, amount }) => [kind, amount?.value])]).toEqual([3, [["longer-flange", 8]]]);
    const firm = runCommand(["plan", "hat.json", ...SHOP, "--robustness", "--batch", "20"], world);
    expect([firm.exitCode, (firm.json as PlanDocument).robustness?.settings[0]]).toEqual([0, expect.objectContaining({ setting: "flip", low: expect.objectContaining({ factor: 0.375 }) })]);
  });

  it.each([
    [[], "verb"],
    [["fold", "u.json"], "fold"],
    [["flat"], "PART.json"],
    [["flat", "nowhere.json"], "nowhere.json"],
    [["flat", "broken.json"], "not JSON"],
    [["flat", "thin.json"], "thickness"],
    [["flat", "wood.json"], "material"],
    [["flat", "u.json", "--bend-table", "nowhere.json"], "nowhere.json"],
    [["flat", "u.json", "--bend-table", "u.json"], "bend-table/1"],
    [["flat", "u.json", "--bend-table", "wrongBends.json"], "trials[0].blankLength"],
    [["plan", "u.json", "--machine", "machine.json"], "--tooling"],
    [["plan", "u.json", "--tooling", "tooling.json"], "--machine"],
    [["plan", "u.json", ...SHOP, "--batch", "0"], "--batch"],
    [["plan", "u.json", ...SHOP, "--batch", "many"], "--batch"],
    [["plan", "u.json", ...SHOP, "--time-limit"], "--time-limit"],
    [["plan", "u.json", ...SHOP, "--speed", "9"], "--speed"],
    [["check", "u.json", ...SHOP], "--order"],
    [["check", "u.json", ...SHOP, "--order", "b1,b1"], "b1"],
    [["check", "u.json", ...SHOP, "--order", "b1"], "b2"],
    [["plan", "u.json", "--tooling", "machine.json", "--machine", "machine.json"], "machine.json"],
  ])("leaves with 2 and one line that names the field: %j", (args, named) => {
    const { exitCode, json, error } = runCommand(args, world);
    expect([exitCode, json]).toEqual([2, null]);
    expect(error).toContain(named);
    expect(error).not.toContain("\n");
  });
});
