import { describe, expect, test } from "vitest";
import { trialMachine } from "../clearance/trial/trialTools";
import { partOf, profilePart } from "../clearance/trial/trialParts";
import { invariant } from "../core/invariant";
import { mm } from "../core/units";
import type { DocumentVertex, PartDocument } from "../part/partDocument";
import type { PartModel } from "../part/partModel";
import type { Machine } from "../tooling/machine";
import { gaugeOptions } from "./gaugeOptions";
import { placeFingers } from "./placeFingers";

/** Fingers 18 mm high, 40 mm wide, at least 60 mm apart. */
const gauge = { ...trialMachine.gauge, fingerProfile: [[0, 0], [50, 0], [50, 18], [0, 18]] as const };
const machine: Machine = { ...trialMachine, gauge };
const [thickness, radius] = [2, 2.6];
const setback = thickness + radius;

const half = (part: PartModel, bend = 0) => (part.bends[bend]?.allowance ?? NaN) / 2;
const only = <T>(found: readonly T[]): T => {
  invariant(found.length === 1 && found[0] !== undefined, `one of them: ${JSON.stringify(found)}`);
  return found[0];
};

/** A base with a flange on edge 0. */
const plate = (outline: readonly DocumentVertex[]): PartModel => partOf({
  format: "part/1", name: "Plate", units: "mm", material: "S235", thickness, insideRadius: radius,
  base: { outline }, flanges: [{ id: "front", on: "base", edge: 0, length: 30, angle: 90, direction: "up" }],
} satisfies PartDocument);

describe("a flange that is bent already", () => {
  test("standing up: X is the leg between less one setback and half the zone, R where its plane part begins", () => {
    const u = profilePart([40, 100, 40], [90, 90]);
    const option = only(gaugeOptions(u, { bends: [1], front: 2, formed: 1 }, machine).filter(({ on }) => on === "face"));
    expect(option.x).toBeCloseTo(100 - setback + half(u), 9);
    expect(option.r).toBeCloseTo(setback, 9);
    expect(option).toMatchObject({ face: 0, slope: 0 });
    expect(option.free).toEqual([[-80, 80]]);
  });

  test("hanging: the top of the finger is where the plane part begins, also of a flange that is shorter than the finger", () => {
    for (const leg of [40, 20]) {
      const z = profilePart([leg, 60, 30], [90, -90]);
      const option = only(gaugeOptions(z, { bends: [1], front: 2, formed: 1 }, machine).filter(({ on }) => on === "face"));
      expect(option.x).toBeCloseTo(60 - setback + half(z), 9);
      expect(option.r).toBeCloseTo(-radius - 18, 9);
      expect(option.free).toEqual([[-80, 80]]);
    }
  });

  test("out of reach of R, or with too little of it plane, it offers nothing", () => {
    const z = profilePart([40, 60, 30], [90, -90]);
    expect(gaugeOptions(z, { bends: [1], front: 2, formed: 1 }, { ...machine, gauge: { ...gauge, r: [mm(-20), mm(200)] } })).toEqual([]);
    const low = profilePart([setback + 1.5, 60, 30], [90, -90]);
    expect(gaugeOptions(low, { bends: [1], front: 2, formed: 1 }, machine)).toEqual([]);
  });
});

describe("a slanted edge", () => {
  // From (200, 100) to (0, 60): 0.2 mm deeper a millimetre along the bed.
  const slanted = plate([[0, 0], [200, 0], [200, 100], [0, 60]]);
  const hit = { bends: [0], front: 1, formed: 0 };

  test("independent fingers stand at two depths: on it by half their width, touching with the corner that comes first", () => {
    const option = only(gaugeOptions(slanted, hit, machine));
    expect(Math.abs(option.slope)).toBeCloseTo(0.2, 9);
    // In the middle of the edge 80 from the drawn corner; half a finger of 40 farther the edge is 4 mm deeper.
    expect(option.x).toBeCloseTo(80 - setback + half(slanted) + 4, 6);
    expect(option.free).toEqual([[expect.closeTo(-80, 6), expect.closeTo(80, 6)]]);
    const [one, other] = placeFingers(option, gauge, 0).map((z) => option.x + option.slope * z);
    expect(Math.abs((one ?? 0) - (other ?? 0))).toBeCloseTo(0.2 * 160, 6);
  });

  test("fingers that move together, or one alone, do not hold it", () => {
    expect(gaugeOptions(slanted, hit, { ...machine, gauge: { ...gauge, independent: false } })).toEqual([]);
    expect(gaugeOptions(slanted, hit, { ...machine, gauge: { ...gauge, fingers: 1 } })).toEqual([]);
  });

  test("only the stretch within X travel counts", () => {
    const middle = only(gaugeOptions(slanted, hit, machine)).x;
    const option = only(gaugeOptions(slanted, hit, { ...machine, gauge: { ...gauge, x: [mm(8), mm(middle)] } }));
    const [free] = option.free;
    invariant(free, "some of it is within");
    const depths = free.map((z) => option.x + option.slope * z);
    expect(Math.max(...depths)).toBeLessThanOrEqual(middle + 1e-9);
    expect(free[1] - free[0]).toBeCloseTo(60, 6);
  });

  test("no finger stands in sheet that sticks out beside it, wherever that is", () => {
    // An ear from x = 100 to 120 parts the edge in two.
    const eared = plate([[0, 0], [200, 0], [200, 100], [120, 84], [120, 110], [100, 110], [100, 80], [0, 60]]);
    const found = gaugeOptions(eared, hit, machine).filter(({ slope }) => slope !== 0);
    expect(found).toHaveLength(2);
    for (const { slope, free } of found) {
      const ear = slope > 0 ? [0, 20] as const : [-20, 0] as const;
      for (const [from, to] of free) expect(Math.min(to + 20, ear[1]) - Math.max(from - 20, ear[0])).toBeLessThan(1e-6);
    }
  });

  test("steeper than 45 degrees no finger holds", () => {
    expect(gaugeOptions(plate([[0, 0], [60, 0], [60, 150], [0, 80]]), hit, machine)).toEqual([]);
  });
});

describe("fingers", () => {
  const option = { x: 50, slope: 0, r: 0, on: "edge", face: 0, edge: 2, free: [[-80, 80]] } as const;

  test("stand as far apart as they can, within the reach of Z wherever the stroke is on the bed", () => {
    expect(placeFingers(option, gauge, 0)).toEqual([-80, 80]);
    expect(placeFingers(option, gauge, 1480)).toEqual([-80, 20]);
    expect(placeFingers({ ...option, free: [[-80, -40], [10, 30], [70, 80]] }, gauge, 0)).toEqual([-80, 80]);
  });

  test("where two have no room one stands in the middle of the widest place, and where none reaches none does", () => {
    expect(placeFingers({ ...option, free: [[-20, 20]] }, gauge, 0)).toEqual([0]);
    expect(placeFingers(option, gauge, 1550)).toEqual([-65]);
    expect(placeFingers(option, gauge, 1600)).toEqual([]);
  });
});
