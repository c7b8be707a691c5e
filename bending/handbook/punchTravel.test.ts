import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { deg, mm, toRad } from "../core/units";
import type { DieOpening, OpeningBetweenTops } from "./dieOpening";
import { flangeAtContact } from "./flangeAtContact";
import { flangeWithMargin } from "./flangeWithMargin";
import { legToApex } from "./legToApex";
import { legToOutermostTangent } from "./legToOutermostTangent";
import { openingBetweenTops } from "./openingBetweenTops";
import { outsideSetback } from "./outsideSetback";
import { punchTravel } from "./punchTravel";

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });
/** A sheet and a die that fit: V of 6 to 12 thicknesses, radius about V / 6. */
const bend = fc.record({ thickness: between(0.5, 8), times: between(6, 12), radiusPart: between(0.1, 0.2), shoulderPart: between(0.04, 0.12), degrees: between(5, 140) })
  .map(({ thickness, times, radiusPart, shoulderPart, degrees }) => {
    const opening = thickness * times;
    const die: OpeningBetweenTops = { measured: "between-tops", opening: mm(opening), shoulderRadius: mm(shoulderPart * opening) };
    return { thickness: mm(thickness), radius: mm(radiusPart * opening), die, angle: toRad(deg(degrees)) };
  });

describe("punch travel and contact flange", () => {
  test("one die named in both ways gives one travel and one flange; taken for the other kind it does not", () => {
    fc.assert(fc.property(bend, between(30, 90), ({ angle, radius, thickness, die }, dieDegrees) => {
      const dieAngle = toRad(deg(dieDegrees));
      const face = die.shoulderRadius * Math.tan(Math.PI / 4 - dieAngle / 4);
      const corners: DieOpening = { measured: "between-corners", opening: mm(die.opening - 2 * face), shoulderRadius: die.shoulderRadius, dieAngle };
      expect(openingBetweenTops(corners).opening).toBeCloseTo(die.opening, 9);
      expect(punchTravel(angle, radius, thickness, corners)).toBeCloseTo(punchTravel(angle, radius, thickness, die), 9);
      expect(flangeAtContact(angle, corners)).toBeCloseTo(flangeAtContact(angle, die), 9);
      const mistaken: DieOpening = { ...die, opening: corners.opening };
      expect(flangeAtContact(angle, mistaken)).toBeLessThan(flangeAtContact(angle, corners));
    }));
  });

  test("the margin never takes from the contact flange", () => {
    fc.assert(fc.property(bend, ({ angle, die }) => {
      const need = flangeWithMargin(angle, die);
      expect(need.advised).toBeGreaterThanOrEqual(need.contact);
      expect(need.halfBlank).toBe(die.opening / 2);
    }));
  });
});

describe("document lengths", () => {
  test("a leg over 90 degrees ends at the farthest point of the sampled outside arc, under 90 at the apex", () => {
    fc.assert(fc.property(bend, between(0, 100), ({ angle, radius, thickness }, straight) => {
      const reach = radius + thickness;
      const apexLeg = mm(straight + reach * Math.tan(angle / 2));
      let farthest = 0;
      for (let i = 0; i <= 2000; i += 1) farthest = Math.max(farthest, reach * Math.sin((angle * i) / 2000));
      const leg = legToOutermostTangent(apexLeg, angle, radius, thickness);
      expect(leg).toBeCloseTo(angle > Math.PI / 2 ? straight + farthest : apexLeg, 4);
      expect(leg - outsideSetback(angle, radius, thickness)).toBeCloseTo(straight, 8);
      expect(legToApex(leg, angle, radius, thickness)).toBeCloseTo(apexLeg, 8);
    }));
  });
});
