import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { deg, mm, rad, toRad, MM_PER_INCH, type Rad } from "../core/units";
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

/** Outside surface of one half, the lowest point of the arc at y = 0: the arc, then the straight wing. */
function outside(angle: Rad, reach: number, wing: number): readonly (readonly [number, number])[] {
  const half = angle / 2;
  const steps = 3000;
  const end = [reach * Math.sin(half), reach * (1 - Math.cos(half))] as const;
  return Array.from({ length: 2 * steps + 1 }, (_, i) => {
    if (i < steps) return [reach * Math.sin((half * i) / steps), reach * (1 - Math.cos((half * i) / steps))] as const;
    const along = (wing * (i - steps)) / steps;
    return [end[0] + along * Math.cos(half), end[1] + along * Math.sin(half)] as const;
  });
}

/** Lowers the sampled sheet until it meets the shoulder circle; depth, and how far along the curve it touches. */
function lowered(angle: Rad, reach: number, die: OpeningBetweenTops) {
  const points = outside(angle, reach, (2.5 * die.opening) / 2 / Math.cos(angle / 2));
  const gap = (depth: number) => points.reduce<readonly [number, number]>((best, [x, y], i) => {
    const free = Math.hypot(x - die.opening / 2, y - depth + die.shoulderRadius) - die.shoulderRadius;
    return free < best[0] ? [free, i] : best;
  }, [Infinity, 0]);
  let [low, high] = [0, die.opening * 3];
  for (let i = 0; i < 40; i += 1) {
    const middle = (low + high) / 2;
    // Deep under the shoulder the sheet would be free again: the wing there passes through the die's middle line.
    const [x, y] = points.at(-1) ?? [0, 0];
    const wingOver = y - middle - Math.tan(angle / 2) * (x - die.opening / 2) > -die.shoulderRadius;
    if (gap(middle)[0] > 0 && wingOver) low = middle;
    else high = middle;
  }
  return { depth: low, touch: points[gap(low)[1]] ?? [NaN, NaN] };
}

describe("punch travel and contact flange", () => {
  test("lowering a sampled sheet on to the shoulder circles stops where the closed forms say", () => {
    fc.assert(fc.property(bend, ({ angle, radius, thickness, die }) => {
      const reach = radius + thickness;
      const { depth, touch } = lowered(angle, reach, die);
      expect(Math.abs(depth - punchTravel(angle, radius, thickness, die))).toBeLessThan(1e-3 * die.opening);
      const apexHeight = reach * (1 - 1 / Math.cos(angle / 2));
      const fromApex = Math.hypot(touch[0], touch[1] - apexHeight);
      expect(Math.abs(fromApex - flangeAtContact(angle, die))).toBeLessThan(4e-3 * die.opening / Math.cos(angle / 2));
    }), { numRuns: 40 });
  });

  test("the punch goes deeper for every degree", () => {
    fc.assert(fc.property(bend, between(0.1, 10), ({ angle, radius, thickness, die }, more) => {
      expect(punchTravel(rad(angle + toRad(deg(more))), radius, thickness, die)).toBeGreaterThan(punchTravel(angle, radius, thickness, die));
    }));
  });

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

  test("in inches the travel and the flange are the same", () => {
    fc.assert(fc.property(bend, ({ angle, radius, thickness, die }) => {
      const inch = (value: number) => mm(value / MM_PER_INCH);
      const small: DieOpening = { ...die, opening: inch(die.opening), shoulderRadius: inch(die.shoulderRadius) };
      expect(punchTravel(angle, inch(radius), inch(thickness), small) * MM_PER_INCH).toBeCloseTo(punchTravel(angle, radius, thickness, die), 8);
      expect(flangeAtContact(angle, small) * MM_PER_INCH).toBeCloseTo(flangeAtContact(angle, die), 8);
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
