import { describe, expect, test } from "vitest";
import { createDice, partOf, profilePart, trayPart } from "../clearance/trial/trialParts";
import { invariant } from "../core/invariant";
import { mm, rad } from "../core/units";
import { applyFrame } from "../geometry/applyFrame";
import type { PartDocument } from "../part/partDocument";
import type { PartModel } from "../part/partModel";
import type { GaugedStep, Repeats } from "./gaugedStep";
import { levelFrames } from "./levelFrames";
import { legDimensions } from "./legDimensions";
import { partDimensions } from "./partDimensions";
import { partTolerances } from "./partTolerances";
import { bentAs } from "./trial/bentAs";
import { sizesAs } from "./trial/sizesAs";
import { trialSteps, type Wanted } from "./trial/trialSteps";

const gaugeOnly: Repeats = { gauge: mm(0.1), angle: rad(0) };
const both: Repeats = { gauge: mm(0.1), angle: rad(0.005) };
const tolerances = (part: PartModel, steps: readonly GaugedStep[], repeats = both) => partTolerances(part, steps, repeats, partDimensions(part));
const numbers = (part: PartModel, steps: readonly GaugedStep[], repeats = both) =>
  tolerances(part, steps, repeats).map(({ nominal, worstCase, statistical }) => [nominal, worstCase ?? -1, statistical ?? -1].map((value) => expect.closeTo(value, 6) as number));

describe("the tolerance that adds up", () => {
  test.each([2, 3, 4, 5, 6])("a staircase of %i bends, each gauged from the flange before it: the last leg takes every stop, each tread one", (count) => {
    const turns = Array.from({ length: count }, (_, i) => (i % 2 === 0 ? 90 : -90));
    const stairs = profilePart(Array.from({ length: count + 1 }, () => 40), turns);
    const steps = trialSteps(stairs, turns.map((_, bend) => [bend, bend + 1, bend === 0 ? "edge" : ({ on, face }) => on === "face" && face === bend - 1] as [number, number, Wanted]));
    const legs = partTolerances(stairs, steps, gaugeOnly, legDimensions(stairs));
    expect(legs.map(({ worstCase }) => worstCase)).toEqual([...turns.map(() => 0.1), 0.1 * count].map((size) => expect.closeTo(size, 6) as number));
    expect(legs[count]?.shares).toHaveLength(count);
    expect(legs[count]?.statistical).toBeCloseTo(count === 1 ? 0.1 : Math.min(0.1 * count, (0.2 * Math.sqrt(count)) / Math.sqrt(3)), 6);
  });

  test("a flange gauged from its own edge misses by the gauge's stop alone, whatever the angle of its bend in between", () => {
    for (const turn of [20, 45, 90, 120, 150]) {
      const angle = profilePart([60, 50], [turn]);
      const [base, flange] = partTolerances(angle, trialSteps(angle, [[0, 0, "edge"]]), gaugeOnly, legDimensions(angle));
      expect(flange?.worstCase).toBeCloseTo(0.1, 6);
      expect(flange?.statistical).toBeCloseTo(0.1, 6);
      expect(base?.worstCase).toBeCloseTo(0.1, 6);
    }
  });

  test("is in proportion to the repeats, and each share to its own", () => {
    const hat = profilePart([20, 40, 60, 40, 20], [90, -90, -90, 90]);
    const steps = trialSteps(hat, [[0, 1, "edge"], [3, 3, "edge"], [1, 2, "face"], [2, 2, "face"]]);
    const [once, twice] = [tolerances(hat, steps), tolerances(hat, steps, { gauge: mm(0.2), angle: rad(0.01) })];
    once.forEach((one, i) => {
      expect(twice[i]?.worstCase).toBeCloseTo(2 * (one.worstCase ?? NaN), 6);
      expect(twice[i]?.statistical).toBeCloseTo(2 * (one.statistical ?? NaN), 6);
      expect(one.worstCase).toBeCloseTo(one.shares.reduce((sum, { gauge, angle }) => sum + gauge + angle, 0), 9);
      expect(one.statistical).toBeLessThanOrEqual((one.worstCase ?? 0) + 1e-12);
    });
  });

  test("is the same for the mirrored part, bent the other way up", () => {
    const order: readonly (readonly [number, number, Wanted])[] = [[0, 1, "edge"], [1, 2, "face"]];
    const [one, other] = [profilePart([40, 60, 30], [90, -80]), profilePart([40, 60, 30], [-90, 80])];
    expect(numbers(one, trialSteps(one, order))).toEqual(tolerances(other, trialSteps(other, order)).map(({ nominal, worstCase, statistical }) => [nominal, worstCase, statistical]));
  });

  test("is the same for the part drawn from its other end", () => {
    const [one, other] = [profilePart([40, 60, 30], [90, -80]), profilePart([30, 60, 40], [-80, 90])];
    const first = partTolerances(one, trialSteps(one, [[0, 1, "edge"], [1, 2, "face"]]), both, legDimensions(one));
    const last = partTolerances(other, trialSteps(other, [[1, 1, "edge"], [0, 0, "face"]]), both, legDimensions(other));
    first.forEach((leg, i) => expect(leg.worstCase).toBeCloseTo(last[last.length - 1 - i]?.worstCase ?? NaN, 6));
  });

  test("does not depend on names or on the document's unit", () => {
    const document = (size: number, units: "mm" | "in", id: string): PartDocument => ({
      format: "part/1", name: id, units, material: "S235", thickness: 2 / size, insideRadius: 2.6 / size,
      base: { outline: [[0, 0], [120 / size, 0], [120 / size, 80 / size], [0, 80 / size]], holes: [{ circle: [40 / size, 30 / size], diameter: 6 / size }] },
      flanges: [{ id, on: "base", edge: 0, length: 30 / size, angle: 90, direction: "up" }, { id: `${id}2`, on: "base", edge: 2, length: 25 / size, angle: 90, direction: "down" }],
    });
    const parts = [partOf(document(1, "mm", "a")), partOf(document(25.4, "in", "zz"))];
    const [one, other] = parts.map((part) => tolerances(part, trialSteps(part, [[0, 0, "edge"], [1, 0, "edge"]])).map(({ nominal, worstCase, statistical }) => [nominal, worstCase, statistical]));
    expect(other).toEqual((one ?? []).map((row) => row.map((value) => expect.closeTo(value ?? -1, 6) as number)));
    expect(one?.length).toBeGreaterThan(5);
  });
});

/** Where the fingers really meet the part: an edge, or an upright surface at the height where it was meant to be touched. */
function stopDepth(bent: PartModel, step: GaugedStep, height: number | null): number {
  const frame = step.touch ? levelFrames(bent, step)[step.touch.face] : undefined;
  invariant(frame && step.touch, "a gauged step");
  const [x, y] = applyFrame(frame, step.touch.point);
  return height === null ? x : x - (frame.z[1] * (height - y)) / frame.z[0];
}

/** What every step is meant to find: at which height a standing flange, how deep. */
const meantBy = (part: PartModel, steps: readonly GaugedStep[]) => steps.map((step) => {
  const frame = step.touch ? levelFrames(part, step)[step.touch.face] : undefined;
  invariant(frame && step.touch, "a gauged step");
  const height = Math.abs(frame.z[0]) > 0.5 ? applyFrame(frame, step.touch.point)[1] : null;
  return { height, depth: stopDepth(part, step, height) };
});

/** One part bent with these errors, step after step, each line where the fingers put it. */
function bendOne(part: PartModel, steps: readonly GaugedStep[], meant: ReturnType<typeof meantBy>, stops: readonly number[], turns: readonly number[]): PartModel {
  const shift: number[] = [];
  steps.forEach((step, s) => {
    const { height, depth: nominal } = meant[s] ?? { height: null, depth: 0 };
    // The line is moved until the depth is right: the depth is straight in it, so two tries tell.
    const depth = (at: number) => stopDepth(bentAs(part, steps, { shift: [...shift, at], turn: turns.slice(0, s) }), step, height);
    const [d0, d1] = [depth(0), depth(1)];
    shift.push((nominal + (stops[s] ?? 0) - d0) / (d1 - d0));
  });
  return bentAs(part, steps, { shift, turn: turns });
}

describe("2000 parts bent with random errors", () => {
  const cases: readonly (readonly [string, PartModel, readonly (readonly [number, number, Wanted])[]])[] = [
    ["Z from its flange", profilePart([40, 60, 30], [90, -90]), [[0, 1, "edge"], [1, 2, "face"]]],
    ["hat from its brims", profilePart([20, 40, 60, 40, 20], [90, -90, -90, 90]), [[0, 1, "edge"], [3, 3, "edge"], [1, 2, "face"], [2, 2, "face"]]],
    ["tray with returns", trayPart(40, -16), [[4, 2, "edge"], [5, 4, "edge"], [0, 0, "edge"], [2, 0, "edge"], [1, 0, "edge"], [3, 0, "edge"]]],
  ];
  test.each(cases)("%s: scatter as computed within 3 %, never over the worst case, at least 94.5 % within the statistical", (_, part, order) => {
    const PARTS = 2000;
    const steps = trialSteps(part, order);
    const dimensions = partDimensions(part).map((dimension) => ({ ...dimension, from: dimension.from.slice(0, 1), to: dimension.to.slice(0, 1) }));
    const expected = partTolerances(part, steps, both, dimensions);
    const drawn = sizesAs(part, part, dimensions);
    const meant = meantBy(part, steps);
    const dice = createDice(20261201);
    const errors = drawn.map((): number[] => []);
    for (let made = 0; made < PARTS; made += 1) {
      const bent = bendOne(part, steps, meant, steps.map(() => dice(-both.gauge, both.gauge)), steps.map(() => dice(-both.angle, both.angle)));
      sizesAs(part, bent, dimensions).forEach((size, i) => errors[i]?.push(size - (drawn[i] ?? 0)));
    }
    errors.forEach((found, i) => {
      const { worstCase, statistical, shares } = expected[i] ?? { worstCase: null, statistical: null, shares: [] };
      invariant(worstCase !== null && statistical !== null, "every step is gauged");
      const deviation = Math.sqrt(found.reduce((sum, error) => sum + error ** 2, 0) / PARTS);
      const computed = Math.hypot(...shares.flatMap(({ gauge, angle }) => [gauge, angle])) / Math.sqrt(3);
      expect(Math.abs(deviation / computed - 1)).toBeLessThan(0.03);
      expect(Math.max(...found.map(Math.abs))).toBeLessThan(worstCase * 1.005);
      expect(found.filter((error) => Math.abs(error) <= statistical + 1e-3 * worstCase).length / PARTS).toBeGreaterThan(0.945);
    });
  });
});
