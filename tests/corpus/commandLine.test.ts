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
};

const world: CommandWorld = {
  now: () => 0,
  readText: (path) => {
    if (extra[path] !== undefined) return { ok: true, value: extra[path] };
    try {
      return { ok: true, value: readFileSync(new URL(`plans/${path}`, import.meta.url), "utf8") };
    } catch {
      return { ok: false, error: "there is no such file" };
    }
  },
};
const SHOP = ["--tooling", "tooling.json", "--machine", "machine.json"];

describe("the command line", () => {
  it("prints the flat of a profile", () => {
    const { exitCode, json, error } = runCommand(["flat", "u.json"], world);
    expect([exitCode, error]).toEqual([0, null]);
    expect((json as { flatLength: number }).flatLength).toBeCloseTo(172.325, 2);
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

  it.each([
    [[], "verb"],
    [["fold", "u.json"], "fold"],
    [["flat"], "PART.json"],
    [["flat", "nowhere.json"], "nowhere.json"],
    [["flat", "broken.json"], "not JSON"],
    [["flat", "thin.json"], "thickness"],
    [["flat", "wood.json"], "material"],
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
