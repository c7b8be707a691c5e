import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { mm, type Mm } from "../core/units";
import type { Interval } from "../geometry/interval";
import type { FlatPoint } from "../geometry/vec2";
import type { PartModel } from "../part/partModel";
import { createClearance } from "./createClearance";
import type { Hit } from "./machineFrames";
import { createDice, partOf, profilePart, randomPart, trayPart } from "./trial/trialParts";
import { relievedPunch, straightPunch, trialMachine, vDie } from "./trial/trialTools";

const punch = straightPunch("P88");
const die = vDie("V16");
const tools = [punch, die, relievedPunch("R", "back"), vDie("V20-tall", 20, 80, 60)];
const ask = (part: PartModel, hit: Hit, obstacle = tools[0]!, margin?: Mm) => createClearance(part, trialMachine, margin ? { margin } : {}).forbidden(hit, punch, die, obstacle);
const seeds = fc.integer({ min: 1, max: 100_000 });

function randomHit(part: PartModel, dice: (from: number, to: number) => number): Hit {
  const bend = Math.floor(dice(0, part.bends.length - 1e-9));
  const front = (dice(0, 1) < 0.5 ? part.bends[bend]?.parent : part.bends[bend]?.child) ?? 0;
  return { bends: [bend], front, formed: Math.floor(dice(0, 2 ** part.bends.length)) & ~(1 << bend) };
}

/** The same part seen in a mirror that turns the sheet's x about. */
function mirrored(part: PartModel, shift = 0): PartModel {
  const at = ([x, y]: FlatPoint): FlatPoint => [shift - x, y];
  const ring = (points: readonly FlatPoint[]) => points.map(at).reverse();
  return {
    ...part,
    faces: part.faces.map((face) => ({ ...face, outline: ring(face.outline), holes: face.holes.map(ring) })),
    bends: part.bends.map((bend) => ({
      ...bend,
      line: [at(bend.line[1]), at(bend.line[0])],
      zone: [at(bend.zone[3]), at(bend.zone[2]), at(bend.zone[1]), at(bend.zone[0])],
    })),
  };
}

const near = (a: readonly Interval[], b: readonly Interval[]) => {
  expect(a.length).toBe(b.length);
  a.forEach(([from, to], i) => {
    expect(from).toBeCloseTo(b[i]?.[0] ?? NaN, 6);
    expect(to).toBeCloseTo(b[i]?.[1] ?? NaN, 6);
  });
};

describe("laws of clearance", { timeout: 120_000 }, () => {
  it("a mirrored part has mirrored intervals, wherever its sheet lies", () => {
    fc.assert(fc.property(seeds, fc.nat(3), fc.double({ min: -500, max: 500, noNaN: true }), (seed, tool, shift) => {
      const dice = createDice(seed);
      const part = randomPart(dice);
      const hit = randomHit(part, dice);
      const straight = ask(part, hit, tools[tool]);
      near(ask(mirrored(part, shift), hit, tools[tool]), straight.map(([from, to]): Interval => [-to, -from]).reverse());
    }), { numRuns: 40 });
  });

  // Of the stroke's own punch and die: a neighbour is also met on the way that these two choose, and more clearance may choose another way.
  it("more clearance never frees anything: where punch and die might not stand they still may not, or the part is trapped", () => {
    fc.assert(fc.property(seeds, fc.nat(1), (seed, tool) => {
      const dice = createDice(seed);
      const part = randomPart(dice);
      const hit = randomHit(part, dice);
      const trappedAt = (margin: Mm) => createClearance(part, trialMachine, { margin }).blocked(hit, punch, die).flatMap(({ kind, strokeAngle }) => (kind === "trapped" ? [strokeAngle] : []));
      const [before, after] = [trappedAt(mm(1)), trappedAt(mm(2))];
      expect(after).toEqual(expect.arrayContaining(before));
      if (after.length > before.length) return;
      const wide = ask(part, hit, tools[tool], mm(2));
      for (const [from, to] of ask(part, hit, tools[tool], mm(1))) {
        expect(wide.some(([a, b]) => a <= from + 1e-9 && b >= to - 1e-9)).toBe(true);
      }
    }), { numRuns: 40 });
  });

  it("evidence holds for every state that agrees on the bends it names, and nothing depends on what was asked before", () => {
    fc.assert(fc.property(seeds, (seed) => {
      const dice = createDice(seed);
      const part = randomPart(dice);
      const hit = randomHit(part, dice);
      const used = createClearance(part, trialMachine);
      const found = [...used.evidence(hit, punch, die, punch), ...used.blocked(hit, punch, die)].filter(({ kind }) => kind !== "trapped");
      for (const { kind, face, otherFace, mask, value, strokeAngle } of found) {
        const other = { ...hit, formed: (Math.floor(dice(0, 2 ** part.bends.length)) & ~mask & ~(1 << (hit.bends[0] ?? 0))) | value };
        const fresh = createClearance(part, trialMachine);
        const again = [...fresh.evidence(other, punch, die, punch), ...fresh.blocked(other, punch, die)];
        if (kind !== "punch") expect(again.some((hitAgain) => hitAgain.kind === kind && hitAgain.face === face && hitAgain.otherFace === otherFace && hitAgain.strokeAngle === strokeAngle)).toBe(true);
        const fromUsed = used.forbidden(other, punch, die, punch);
        near(fromUsed, fresh.forbidden(other, punch, die, punch));
      }
    }), { numRuns: 40 });
  });
});

describe("cases that every shop knows", () => {
  const clear = (part: PartModel, hit: Hit, with_ = punch, on = die) => {
    const clearance = createClearance(part, trialMachine);
    return { tool: clearance.forbidden(hit, with_, on, with_), die: clearance.forbidden(hit, with_, on, on), blocked: clearance.blocked(hit, with_, on) };
  };

  it("a plain angle clears everything, long leg in front or at the back", () => {
    for (const front of [0, 1]) expect(clear(profilePart([40, 400], [90]), { bends: [0], front, formed: 0 })).toEqual({ tool: [], die: [], blocked: [] });
  });

  it("a deep narrow U hits a straight punch, and clears one relieved on that side", () => {
    const part = profilePart([34, 40, 34], [90, 90]);
    const hit = { bends: [1], front: 2, formed: 1 };
    expect(clear(part, hit).tool).toEqual([[-101, 101]]);
    expect(clear(part, hit, relievedPunch("front", "front")).tool).toEqual([[-101, 101]]);
    expect(clear(part, hit, relievedPunch("back", "back"))).toEqual({ tool: [], die: [], blocked: [] });
    const evidence = createClearance(part, trialMachine).evidence(hit, punch, die, punch);
    expect(evidence[0]).toMatchObject({ kind: "punch", face: 0, tool: "P88", mask: 1, value: 1 });
  });

  it("a flange that hangs down hits the die when the web is short, and the bed when it is long", () => {
    expect(clear(profilePart([30, 16, 40], [-90, 90]), { bends: [1], front: 2, formed: 1 }).die.length).toBe(1);
    expect(clear(profilePart([30, 50, 40], [-90, 90]), { bends: [1], front: 2, formed: 1 })).toEqual({ tool: [], die: [], blocked: [] });
    const long = clear(profilePart([90, 50, 40], [-90, 90]), { bends: [1], front: 2, formed: 1 });
    expect(long.die).toEqual([]);
    expect(long.blocked.some(({ kind, face }) => kind === "bed" && face === 0)).toBe(true);
  });

  it("a tall flange that is formed first hits the ram", () => {
    const { blocked } = clear(profilePart([220, 90, 40], [90, 90]), { bends: [1], front: 2, formed: 1 });
    expect(blocked.some(({ kind, face, depth }) => kind === "ram" && face === 0 && depth > 1)).toBe(true);
    expect(clear(profilePart([220, 90, 40], [90, 90]), { bends: [0], front: 0, formed: 2 }).blocked).toEqual([]);
  });

  it("the last side of a tray leaves the punch just the inside length, less the margin and the corner's radius", () => {
    const { tool, blocked } = clear(trayPart(40, 0), { bends: [0], front: 0, formed: 0b1110 });
    expect(blocked).toEqual([]);
    expect(tool.length).toBe(2);
    expect(tool[0]?.[1]).toBeCloseTo(-(100 - 2 - 2.6 - 1), 1);
    expect(tool[1]?.[0]).toBeCloseTo(100 - 2 - 2.6 - 1, 1);
  });

  it("returns that reach in over the ends take their depth off the punch", () => {
    const { tool } = clear(trayPart(40, 15), { bends: [0], front: 0, formed: 0b111110 });
    expect(tool[0]?.[1]).toBeCloseTo(-(100 - 15 - 1), 1);
  });

  it("a punch stands in a window of a face that covers the bend, and only there", () => {
    const holes = [{ polygon: [[25, 20], [75, 20], [75, 82], [25, 82]] }] as const;
    const covered = (open: boolean) => partOf({
      format: "part/1", name: "Cover", units: "mm", material: "S235", thickness: 2, insideRadius: 2.6,
      base: { outline: [[0, 0], [100, 0], [100, 60], [0, 60]] },
      flanges: [
        { id: "low", on: "base", edge: 0, length: 30, angle: 30, direction: "up" },
        { id: "wall", on: "base", edge: 2, length: 60, angle: 90, direction: "up" },
        { id: "cover", on: "wall", edge: 2, length: 100, angle: 90, direction: "up", ...(open ? { holes } : {}) },
      ],
    });
    const hit = { bends: [0], front: 1, formed: 0b110 };
    expect(clear(covered(false), hit).tool).toEqual([[-51, 51]]);
    const through = clear(covered(true), hit).tool;
    expect(through.length).toBe(2);
    expect(through[0]?.[1]).toBeCloseTo(-24, 6);
    expect(through[1]?.[0]).toBeCloseTo(24, 6);
  });

  it("two bends on one line are one hit, and the gap between their flanges counts", () => {
    const part = partOf({
      format: "part/1", name: "Two tabs", units: "mm", material: "S235", thickness: 2, insideRadius: 2.6,
      base: { outline: [[0, 0], [60, 0], [60, 30], [140, 30], [140, 0], [200, 0], [200, 120], [0, 120]] },
      flanges: [
        { id: "left", on: "base", edge: 0, length: 40, angle: 90, direction: "up" },
        { id: "right", on: "base", edge: 4, length: 40, angle: 90, direction: "up" },
      ],
    });
    const both = clear(part, { bends: [0, 1], front: 0, formed: 0 });
    expect(both).toEqual({ tool: [], die: [], blocked: [] });
  });

  it("sides that would run into each other are found, a closed corner is not one of them", () => {
    const box = trayPart(40, 0);
    expect(clear(box, { bends: [3], front: 0, formed: 0b111 }).blocked).toEqual([]);
    const crossing = profilePart([60, 60, 60, 60], [90, 90, 90]);
    const { blocked } = clear(crossing, { bends: [2], front: 2, formed: 0b11 });
    expect(blocked.some(({ kind }) => kind === "self")).toBe(true);
  });

  it("a flange passes the sheet that it is bent from as near as it was drawn, but may not enter it", () => {
    const slit = (inset: number) => partOf({
      format: "part/1", name: "Slit", units: "mm", material: "S235", thickness: 2, insideRadius: 2.6,
      base: { outline: [[0, 0], [200, 0], [200, 140], [0, 140]] },
      flanges: [{ id: "side", on: "base", edge: 0, length: 40, angle: 90, direction: "up", start: inset, end: inset, relief: { kind: "tear" } }],
    });
    const self = (part: PartModel) => [0, 1].flatMap((front) => clear(part, { bends: [0], front, formed: 0 }).blocked.filter(({ kind }) => kind === "self"));
    for (const inset of [0.5, 2, 5, 12]) expect(self(slit(inset))).toEqual([]);
    const part = slit(12);
    const tongue: readonly FlatPoint[] = [[4, -20], [4, 5], [8, 5], [8, -20]].map(([x, y]) => [x, y] as unknown as FlatPoint);
    const [base, side] = part.faces;
    if (!base || !side) throw new Error("a part of two faces");
    const entering = { ...part, faces: [base, { ...side, outline: tongue }] };
    expect(self(entering).length).toBeGreaterThan(0);
  });

  it("a closed section cannot be lowered off the punch: said with what would help", () => {
    const part = profilePart([20, 60, 60, 60, 20], [90, 90, 90, 90]);
    const { blocked, tool } = clear(part, { bends: [2], front: 2, formed: 0b1011 }, straightPunch("slim", 85, 150, 8));
    expect(tool.length + blocked.length).toBeGreaterThan(0);
    const trapped = blocked.find(({ kind }) => kind === "trapped");
    expect(trapped?.need).toContain("along the bed");
  });
});
