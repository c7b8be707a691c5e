import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { deg, kgPerCubicMetre, mm, MM_PER_INCH, type Mm } from "../core/units";
import { aluminiumMinimumRadius, aluminiumRadii, type AluminiumTemper } from "./aluminiumMinimumRadius";
import { coldProfileTolerance } from "./coldProfileTolerance";
import { en485MinimumRadius } from "./en485MinimumRadius";
import { gaugeForThickness } from "./gaugeForThickness";
import { gaugeThickness } from "./gaugeThickness";
import { generalAngleTolerance } from "./generalAngleTolerance";
import { generalLengthTolerance } from "./generalLengthTolerance";
import { liftingLimit } from "./liftingLimit";
import { materialById } from "./materials";
import { minimumRadius } from "./minimumRadius";
import { onePersonArea } from "./onePersonArea";
import { sheetMass } from "./sheetMass";

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const system = fc.constantFrom("steel", "stainless", "aluminium");
const temper = fc.constantFrom(...(Object.keys(aluminiumRadii) as AluminiumTemper[]));

describe("gauges", () => {
  test("every gauge comes back out of its thickness", () => {
    fc.assert(fc.property(system, fc.integer({ min: 7, max: 30 }), (name, gauge) => {
      const found = gaugeForThickness(gaugeThickness(gauge, name) ?? mm(NaN), name);
      expect(found).toMatchObject({ gauge, deviation: 0 });
    }));
  });

  test.each([["steel", 0.0299], ["stainless", 1 / 32], ["aluminium", 0.0253]] as const)("22 ga of %s is what its standard prints, to the last digit", (name, inches) => {
    expect(gaugeThickness(22, name)).toBeCloseTo(inches * MM_PER_INCH, 12);
  });

  test("no other gauge lies nearer, and off the chart there is none", () => {
    fc.assert(fc.property(system, between(0.27, 4.2), (name, t) => {
      const found = gaugeForThickness(mm(t), name);
      if (!found) return;
      for (let gauge = 7; gauge <= 30; gauge += 1) {
        expect(Math.abs((gaugeThickness(gauge, name) ?? NaN) - t)).toBeGreaterThanOrEqual(Math.abs(found.deviation) - 1e-12);
      }
    }));
    expect(gaugeForThickness(mm(6), "steel")).toBeNull();
    expect(gaugeForThickness(mm(0.1), "aluminium")).toBeNull();
    expect(gaugeForThickness(mm(NaN), "steel")).toBeNull();
  });
});

describe("minimum radii", () => {
  test("steel along the grain never bends sharper than across it, and thicker never sharper than thinner", () => {
    const steel = materialById("S235");
    if (!steel) throw new Error("no material");
    fc.assert(fc.property(between(0.3, 18), between(0, 2), between(10, 180), (t, more, degrees) => {
      const at = (thickness: number, along: boolean) => minimumRadius(steel, mm(thickness), ((degrees * Math.PI) / 180) as Parameters<typeof minimumRadius>[2], along);
      const [across, along, thicker] = [at(t, false), at(t, true), at(t + more, false)];
      if (across && along) expect(along.radius).toBeGreaterThanOrEqual(across.radius);
      if (across && thicker) expect(thicker.radius).toBeGreaterThanOrEqual(across.radius);
    }));
  });

  test("aluminium between two columns takes the thicker one and says so", () => {
    fc.assert(fc.property(temper, between(0.4, 12.6), between(0, 5), (name, t, more) => {
      const [one, other] = [aluminiumMinimumRadius(name, mm(t)), aluminiumMinimumRadius(name, mm(t + more))];
      if (one && other) expect(other.timesThickness).toBeGreaterThanOrEqual(one.timesThickness);
    }));
    expect(aluminiumMinimumRadius("5052-H32", mm(2))).toMatchObject({ timesThickness: 1.5, betweenColumns: true });
    expect(aluminiumMinimumRadius("5052-H32", mm(MM_PER_INCH / 8))).toMatchObject({ timesThickness: 1.5, betweenColumns: false });
    expect(aluminiumMinimumRadius("6061-T6", mm(13))).toBeNull();
    expect(en485MinimumRadius(mm(0.1))).toBeNull();
    expect(en485MinimumRadius(mm(13))).toBeNull();
  });
});

describe("mass and lifting", () => {
  test("the one-person area has the limit's mass", () => {
    fc.assert(fc.property(between(0.3, 12), between(1000, 9000), between(5, 50), (t, density, limit) => {
      const side = mm(Math.sqrt(onePersonArea(mm(t), kgPerCubicMetre(density), limit)) * 1000);
      expect(sheetMass(side, side, mm(t), kgPerCubicMetre(density))).toBeCloseTo(limit, 8);
    }));
  });

  test("no lift is allowed more than the load constant, and reaching out, turning or lifting far never allows more", () => {
    const length = (max: number) => between(1, max).map(mm);
    fc.assert(fc.property(length(900), length(2000), length(2000), between(0, 180), between(1, 200), (horizontal, height, travel, turn, more) => {
      const lift = { horizontal, height, travel, asymmetry: deg(turn) };
      const { limit } = liftingLimit(lift);
      expect(limit).toBeLessThanOrEqual(23);
      expect(limit).toBeGreaterThanOrEqual(0);
      const farther = (length: Mm) => mm(length + more);
      for (const worse of [{ ...lift, horizontal: farther(horizontal) }, { ...lift, travel: farther(travel) }, { ...lift, asymmetry: deg(turn + more / 10) }, { ...lift, coupling: 0.9 }]) {
        expect(liftingLimit(worse).limit).toBeLessThanOrEqual(limit);
      }
    }));
    expect(liftingLimit({ horizontal: mm(640), height: mm(750), travel: mm(250), asymmetry: deg(0) }).limit).toBe(0);
  });
});

describe("general tolerances", () => {
  test("a coarser class never has less, and a longer size never has less", () => {
    fc.assert(fc.property(between(0.5, 4000), between(0, 500), (size, more) => {
      const values = (["f", "m", "c", "v"] as const).map((name) => generalLengthTolerance(name, mm(size))?.deviation).filter((value) => value !== undefined);
      expect(values).toEqual([...values].sort((a, b) => a - b));
      const [near, far] = [generalLengthTolerance("m", mm(size)), generalLengthTolerance("m", mm(size + more))];
      if (near && far) expect(far.deviation).toBeGreaterThanOrEqual(near.deviation);
    }));
  });

  test("where a class has no entry there is no value, and recalled values say so", () => {
    expect(generalLengthTolerance("f", mm(3000))).toBeNull();
    expect(generalLengthTolerance("v", mm(2))).toBeNull();
    expect(generalLengthTolerance("m", mm(0.4))).toBeNull();
    expect(generalLengthTolerance("m", mm(5000))).toBeNull();
    expect(generalLengthTolerance("c", mm(2))?.seen).toBe(false);
    expect(generalAngleTolerance("m", mm(20))).toEqual({ deviation: 0.5, source: "ISO 2768-1, class m", seen: true });
    expect(coldProfileTolerance("bend-to-bend", mm(300), mm(2))).toBeNull();
    expect(coldProfileTolerance("bend-to-edge", mm(30), mm(9))).toBeNull();
  });
});
