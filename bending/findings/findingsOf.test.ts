import { describe, expect, test } from "vitest";
import type { DocumentHole, FlangeEntry, PartDocument } from "../part/partDocument";
import { applyCure } from "./applyCure";
import type { Finding, FindingRule } from "./finding";
import type { ShopLimits } from "./shopLimits";
import { findingsOf } from "./findingsOf";
import { built, found } from "./trial/found";
import { trialDie, trialShop } from "./trial/trialShop";

const common = { format: "part/1", name: "Trial", units: "mm", material: "S235", thickness: 2, insideRadius: 2.5 } as const;
const profile = (legs: readonly number[], angles: readonly number[], more: Partial<PartDocument> = {}, width = 200): PartDocument =>
  ({ ...common, ...more, profile: { width, legs, bends: angles.map((angle) => ({ angle: Math.abs(angle), direction: angle > 0 ? "up" : "down" })) } }) as PartDocument;
const front = (more: Partial<FlangeEntry> = {}): FlangeEntry => ({ id: "front", on: "base", edge: 0, length: 30, angle: 90, direction: "up", ...more });
const tray = (flanges: readonly FlangeEntry[], holes: readonly DocumentHole[] = [], more: Partial<PartDocument> = {}): PartDocument =>
  ({ ...common, ...more, base: { outline: [[0, 0], [200, 0], [200, 120], [0, 120]], holes }, flanges }) as PartDocument;
const shop = (more: Partial<ShopLimits>): ShopLimits => ({ ...trialShop, ...more });

/**
 * V12 between arc tops, shoulder 1, sheet of 2 mm bent 90 degrees to 2.5 inside. Formed, it holds from 0.7071 x 12 - 1 = 7.485; before the stroke
 * half the V, 6, must lie beside the bend line, which is 6 + 4.5 - 5.023 / 2 = 7.988 to the apex (DIN 6935 allowance 5.023). Usual: 0.70 V = 8.4.
 */
const v12 = shop({ dies: [trialDie(12, 1)] });
/** Where a bend of 90 degrees begins, from the drawn edge: inside radius + thickness. */
const BEGINS = 4.5;

/** A part that a rule speaks against, and the same part changed so that it just does not. */
const cases: readonly (readonly [string, FindingRule, PartDocument, PartDocument, ShopLimits | null])[] = [
  ["a leg under what touches the die", "flange", profile([60, 7.48], [90]), profile([60, 8.4], [90]), v12],
  ["a leg that touches, under what is usual", "flange", profile([60, 8], [90]), profile([60, 8.4], [90]), v12],
  ["a leg between two bends", "flange", profile([60, 10.5, 60], [90, -90], { thickness: 1, insideRadius: 1.2 }), profile([60, 10.6, 60], [90, -90], { thickness: 1, insideRadius: 1.2 }), v12],
  ["the first leg of a profile", "flange", profile([7, 60], [90]), profile([8.4, 60], [90]), v12],
  ["the usual V where no shop is known: 0.7071 x 12", "flange", profile([60, 8.4], [90]), profile([60, 8.5], [90]), null],
  ["a leg that only a narrow V holds", "narrow-v", profile([60, 8.3], [90]), profile([60, 8.4], [90]), shop({ dies: [trialDie(10, 0.5), trialDie(12, 1)] })],
  ["a hole over the opening of the V", "hole", tray([front()], [{ circle: [100, BEGINS + 2.5 + 3.2], diameter: 5 }]), tray([front()], [{ circle: [100, BEGINS + 2.5 + 3.9], diameter: 5 }]), v12],
  ["a hole in the flange, measured from its bend", "hole", tray([front({ holes: [{ circle: [60, BEGINS + 2.5 + 2.5], diameter: 5 }] })]), tray([front({ holes: [{ circle: [60, BEGINS + 2.5 + 4], diameter: 5 }] })]), v12],
  ["a slot of 40 along the bend: 2.5 t", "hole", tray([front()], [moved({ slot: [[80, 20], [117, 20]], width: 3 }, BEGINS + 1.5 + 4.9)]), tray([front()], [moved({ slot: [[80, 20], [117, 20]], width: 3 }, BEGINS + 1.5 + 5.01)]), shop({ dies: [] })],
  ["a hole across the bend line", "hole", tray([front()], [{ circle: [100, 3], diameter: 6 }]), tray([front()], [{ circle: [100, 40], diameter: 6 }]), v12],
  ["a notch that comes down to the bend", "cut-out", notched(BEGINS + 2.9), notched(BEGINS + 6.01), v12],
  ["a notch in a flange, down to its own bend", "cut-out", tray([front({ outline: flangeNotch(BEGINS + 2.9) })].map(withoutLength)), tray([front({ outline: flangeNotch(BEGINS + 6.01) })].map(withoutLength)), v12],
  ["S235 of 2 mm bent to 2 across the grain: DIN 6935 has 2.5", "radius", profile([40, 40], [90], { insideRadius: 2 }), profile([40, 40], [90], { insideRadius: 2.5 }), null],
  ["the same along the grain: the next row, 3", "radius", profile([40, 40], [90], { insideRadius: 2.9, grain: "y" }), profile([40, 40], [90], { insideRadius: 3, grain: "y" }), null],
  ["grain that runs across the bend", "radius", profile([40, 40], [90], { insideRadius: 2.9, grain: 80 }), profile([40, 40], [90], { insideRadius: 2.9, grain: "x" }), null],
  ["a bend that ends next to flat sheet", "relief", tray([front({ start: 30, end: 30 })]), tray([front({ start: 30, end: 30, relief: { kind: "round" } })]), null],
  ["a bend over the whole edge needs none", "relief", tray([front({ start: 30 })]), tray([front()]), null],
  ["letting it tear is a choice", "relief", tray([front({ end: 30 })]), tray([front({ end: 30, relief: { kind: "tear" } })]), null],
  ["a relief narrower than the sheet is thick", "relief-width", tray([front({ start: 30, end: 30, relief: { kind: "rectangular", width: 1.9 } })]), tray([front({ start: 30, end: 30, relief: { kind: "rectangular", width: 2 } })]), null],
  ["a box rolled past its own first leg", "meets-itself", profile([60, 60, 60, 60, 40], [90, 90, 90, 90]), profile([60, 60, 60, 50, 40], [90, 90, 90, 90]), null],
  ["neighbouring flanges bent past one another", "meets-itself", tray([front({ angle: 120 }), front({ id: "side", edge: 1, angle: 120 })]), tray([front({ angle: 80 }), front({ id: "side", edge: 1, angle: 80 })]), null],
  ["two flanges out of the walls of a slot of 40, unfolded over one another", "flats-overlap", slotted(30), slotted(15), null],
  ["an angle beyond the tools", "angle", profile([60, 60], [95]), profile([60, 60], [90]), shop({ punches: trialShop.punches.slice(0, 1) })],
  ["a radius under every tip", "tip-radius", profile([60, 60], [90], { insideRadius: 0.4 }), profile([60, 60], [90], { insideRadius: 0.5 }), trialShop],
  ["a bend longer than the bed and its ends: 2010", "bed", profile([60, 60], [90], {}, 2010.1), profile([60, 60], [90], {}, 2010), trialShop],
  ["sheet deeper than the throat and wider than the frames", "throat", profile([260, 260], [90], {}, 1700), profile([260, 200], [90], {}, 1700), trialShop],
  ["the same sheet between the frames", "throat", profile([260, 260], [90], {}, 1700), profile([260, 260], [90], {}, 1600), trialShop],
  ["a blank over 3000 x 1500", "blank", profile([800, 800], [90], {}, 1900), profile([400, 400], [90], {}, 1900), trialShop],
  ["a blank that the grain does not let turn", "blank", profile([100, 100], [90], { grain: "x" }, 1600), profile([100, 100], [90], { grain: "y" }, 1600), trialShop],
  ["a hem without a tool to flatten it", "hem-tool", hemmed(10), hemmed(10), trialShop],
  ["a return under four thicknesses", "hem-return", hemmed(7.9), hemmed(8), null],
  ["a V whose force the tools do not bear", "tool-force", profile([90, 90], [90], { thickness: 6, insideRadius: 8 }), profile([90, 90], [90], { thickness: 2 }), shop({ dies: [trialDie(12, 1, 86, 300), trialDie(48, 3, 86, 300)] })],
  ["more force than the brake has: 2 m of 4 mm over V24", "machine-force", profile([60, 60], [90], { thickness: 4, insideRadius: 5 }, 2000), profile([60, 60], [90], { thickness: 4, insideRadius: 5 }, 800), trialShop],
  ["a blank over 23 kg: 1.465 m² of 2 mm steel", "mass", profile([500, 500], [90], { insideRadius: 2.5 }, 1480), profile([500, 500], [90], { insideRadius: 2.5 }, 1460), null],
  ["no die for the thickness", "v-opening", profile([90, 90], [90], { thickness: 8, insideRadius: 12 }), profile([90, 90], [90], { thickness: 2 }), trialShop],
  ["no die near the usual V", "v-opening", profile([90, 90], [90], { thickness: 1 }), profile([90, 90], [90], { thickness: 2 }), v12],
];

/** A plate with a slot of 40 in its back edge, a flange up from each wall of it. */
function slotted(length: number): PartDocument {
  const wall = (id: string, edge: number): FlangeEntry => ({ id, on: "base", edge, length, angle: 90, direction: "up", start: 10, end: 10 });
  return { ...common, base: { outline: [[0, 0], [200, 0], [200, 120], [120, 120], [120, 60], [80, 60], [80, 120], [0, 120]] }, flanges: [wall("right", 3), wall("left", 5)] };
}

describe("each rule speaks, and is still when the part is just right", () => {
  test.each(cases)("%s", (_, rule, wrong, right, limits) => {
    const findings = found(wrong, rule, limits);
    expect(findings.length).toBeGreaterThan(0);
    for (const finding of findings) expect(finding.message).toMatch(/^[A-Z].*[.]$/);
    const toolAppears = rule === "hem-tool" ? shop({ flattening: ["Flattener"] }) : limits;
    expect(found(right, rule, toolAppears)).toEqual([]);
  });

  test("every rule is among the cases", () => {
    const rules: Record<FindingRule, true> = {
      flange: true, "narrow-v": true, hole: true, "cut-out": true, radius: true, relief: true, "relief-width": true, "meets-itself": true, "flats-overlap": true, bed: true, throat: true, blank: true,
      "hem-tool": true, "hem-return": true, "machine-force": true, "tool-force": true, mass: true, "v-opening": true, angle: true, "tip-radius": true,
    };
    expect(new Set(cases.map(([, rule]) => rule))).toEqual(new Set(Object.keys(rules)));
  });
});

describe("what a finding says", () => {
  test("a short leg: the exact minimum, the usual one, and the field in the document's own unit", () => {
    const [finding] = found(profile([60, 7], [90]), "flange", v12);
    expect(finding?.severity).toBe("stop");
    expect(finding?.message).toBe("Flange b1 is 7 mm long. V12 (V 12 mm) holds it from 7.99 mm on, and 8.4 mm is usual; no die of the shop that fits this bend needs less.");
    expect(finding?.cure).toEqual({ path: "profile.legs[1]", value: 8.4, says: "8.4 mm" });
  });

  test("in inches the cure is in inches", () => {
    const [finding] = found(profile([2.4, 0.29], [90], { units: "in", thickness: 0.079, insideRadius: 0.1 }, 8), "flange", v12);
    expect(finding?.cure).toEqual({ path: "profile.legs[1]", value: 0.335, says: "0.335 in" });
    expect(finding?.message).toContain("0.29 in long");
  });

  test("without a shop its rules are left out, and the answer says so", () => {
    const document = profile([160, 160], [90], { thickness: 3, insideRadius: 4 }, 9000);
    const part = built(document);
    const [blind, seeing] = [null, trialShop].map((limits) => findingsOf({ part, document, shop: limits }));
    expect(blind?.list.map(({ rule }) => rule)).toEqual(["mass"]);
    expect(blind?.leftOut).toHaveLength(1);
    expect(seeing?.list.map(({ rule }) => rule)).toEqual(expect.arrayContaining(["bed", "blank", "mass"]));
    expect(seeing?.leftOut).toEqual([]);
  });

  test("those that stop stand first", () => {
    const weights = found(tray([front({ length: 6, start: 30 })], [{ circle: [100, 9], diameter: 5 }], { insideRadius: 2 })).map(({ severity }) => ["stop", "caution", "note"].indexOf(severity));
    expect(weights.length).toBeGreaterThan(3);
    expect(weights).toEqual([...weights].sort());
  });

  test("a hole is moved along its own axis, away from the bend", () => {
    const wrong = tray([front({ holes: [{ circle: [60, 9], diameter: 5 }] })]);
    const [finding] = found(wrong, "hole", v12);
    expect(finding?.cure?.path).toBe("flanges[0].holes[0].circle[1]");
    expect(found(applyCure(wrong, cureOf(finding)), "hole", v12)).toEqual([]);
  });

  test("1.5 t + R to the inside of the bend parts the caution of the guides from the note of the V", () => {
    const at = (y: number) => found(tray([front()], [{ circle: [100, y], diameter: 5 }]), "hole", v12).map(({ severity }) => severity);
    expect([2.999, 3.001].map((gap) => at(BEGINS + 2.5 + gap))).toEqual([["caution"], ["note"]]);
  });

  test("a hole with no room to move has no one-field cure", () => {
    const [finding] = found(tray([front({ length: 13, holes: [{ circle: [60, 9], diameter: 7 }] })]), "hole", v12);
    expect(finding?.cure).toBeNull();
  });

  test("a closed hem and a corner drawn closed are no meeting", () => {
    expect(found(hemmed(12), "meets-itself")).toEqual([]);
    expect(found(tray([0, 1, 2, 3].map((edge) => front({ id: `side${edge}`, edge }))), "meets-itself")).toEqual([]);
  });
});

function hemmed(length: number): PartDocument {
  return { ...common, profile: { width: 100, legs: [60, length], bends: [{ angle: 180, direction: "up", hem: "closed" }] } } as PartDocument;
}

/** A base with a notch, 40 wide, from its back edge down to `y`. */
function notched(y: number): PartDocument {
  return { ...common, base: { outline: [[0, 0], [200, 0], [200, 120], [120, 120], [120, y], [80, y], [80, 120], [0, 120]] }, flanges: [front()] } as PartDocument;
}

/** A flange 100 wide and 40 long in its own plane, with a notch 20 wide from its far edge down to `y`. */
function flangeNotch(y: number): NonNullable<FlangeEntry["outline"]> {
  return [[0, 0], [100, 0], [100, 40], [60, 40], [60, y], [40, y], [40, 40], [0, 40]];
}

function withoutLength(entry: FlangeEntry): FlangeEntry {
  const { length, ...rest } = entry;
  return length === undefined ? entry : rest;
}

function moved(hole: { readonly slot: readonly [readonly [number, number], readonly [number, number]]; readonly width: number }, y: number): DocumentHole {
  return { slot: [[hole.slot[0][0], y], [hole.slot[1][0], y]], width: hole.width };
}

function cureOf(finding: Finding | undefined) {
  if (!finding?.cure) throw new Error("no cure");
  return finding.cure;
}
