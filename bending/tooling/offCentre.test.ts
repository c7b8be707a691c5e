import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { kiloNewton, mm } from "../core/units";
import { offCentreLimit, offCentreReach } from "./offCentre";

const brake = (offCentre?: readonly (readonly [number, number])[]) =>
  ({ maxForce: kiloNewton(1000), settings: { ...(offCentre ? { offCentre: offCentre.map(([z, share]) => [mm(z), share] as const) } : {}) } });

const diagrams = fc.array(fc.tuple(fc.integer({ min: 1, max: 400 }), fc.double({ min: 0.5, max: 1, noNaN: true })), { minLength: 1, maxLength: 4 }).map((steps) => {
  let [z, share] = [0, 1];
  return steps.map(([further, part]): readonly [number, number] => [(z += further), (share *= part)]);
});

describe("the off-centre diagram", () => {
  it("gives the rating everywhere when there is none", () => {
    expect([offCentreLimit(brake(), 1400), offCentreReach(brake(), 1000)]).toEqual([1000, Infinity]);
  });

  it("goes straight from point to point, and on with the last share", () => {
    const machine = brake([[800, 1], [1200, 0.5]]);
    expect([0, 800, -1000, 1200, 1500].map((z) => offCentreLimit(machine, z))).toEqual([1000, 1000, 750, 500, 500]);
    expect([1000, 750, 500, 100].map((force) => offCentreReach(machine, force))).toEqual([800, 1000, Infinity, Infinity]);
  });

  it("reaches just as far as the limit allows", () => {
    fc.assert(fc.property(diagrams, fc.double({ min: 1, max: 1000, noNaN: true }), fc.double({ min: 0, max: 2000, noNaN: true }), (diagram, force, z) => {
      const machine = brake(diagram);
      const reach = offCentreReach(machine, force);
      fc.pre(Math.abs(z - reach) > 1e-6 && Math.abs(offCentreLimit(machine, z) - force) > 1e-6);
      expect(offCentreLimit(machine, z) >= force).toBe(z <= reach);
    }));
  });
});
