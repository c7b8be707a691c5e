import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { applyFrame, deg, foldFrames, mm, toRad, type PartDocument, type Vec3 } from "@/bending";
import { found } from "@/bending/findings/trial/found";
import { bendAllowance } from "@/bending/handbook/bendAllowance";
import type { DieOpening } from "@/bending/handbook/dieOpening";
import { flangeAtContact } from "@/bending/handbook/flangeAtContact";
import { holeOverDie } from "@/bending/handbook/holeOverDie";
import { punchTravel } from "@/bending/handbook/punchTravel";
import { apexSetback } from "@/bending/handbook/apexSetback";
import { restOnDie, shoulderPoints, type BentSheet, type DrawnDie } from "./bentSheetOnDie";
import { mustBuild } from "./mustBuild";

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });

/** Included angles from nearly flat to sharp, with dies a little sharper than them. */
const INCLUDED = [170, 150, 135, 120, 105, 90, 75, 60, 45, 30];
const grid = INCLUDED.flatMap((included) => [0.05, 1 / 6, 0.22].flatMap((radiusPart) => [6, 12].flatMap((times) => (["tops", "corners"] as const).map((named) => ({ included, radiusPart, times, named })))));

const openingOf = ({ named, opening, shoulderRadius, dieAngle }: DrawnDie): DieOpening => named === "tops"
  ? { measured: "between-tops", opening: mm(opening), shoulderRadius: mm(shoulderRadius) }
  : { measured: "between-corners", opening: mm(opening), shoulderRadius: mm(shoulderRadius), dieAngle: toRad(deg((dieAngle * 180) / Math.PI)) };

function compare(sheet: BentSheet, die: DrawnDie): readonly [depth: number, flange: number] {
  const [angle, opening] = [toRad(deg((sheet.angle * 180) / Math.PI)), openingOf(die)];
  const { depth, contactFromApex } = restOnDie(sheet, die);
  return [
    Math.abs(depth - punchTravel(angle, mm(sheet.insideRadius), mm(sheet.thickness), opening)) / die.opening,
    Math.abs(contactFromApex - flangeAtContact(angle, opening)) / die.opening,
  ];
}

describe("a sheet let down on a die of points", () => {
  test.each(INCLUDED)("rests at %d degrees where penetration and contact flange say, for either way of naming the V", (included) => {
    for (const { radiusPart, times, named } of grid.filter((point) => point.included === included)) {
      for (const dieDegrees of [included - 2, Math.max(20, included / 2)]) {
        const die: DrawnDie = { named, opening: 16, shoulderRadius: 1.5, dieAngle: (dieDegrees * Math.PI) / 180 };
        const [depth, flange] = compare({ angle: ((180 - included) * Math.PI) / 180, insideRadius: radiusPart * 16, thickness: 16 / times }, die);
        expect(depth).toBeLessThan(1e-6);
        expect(flange).toBeLessThan(1e-3);
      }
    }
  });

  test("whatever the sizes of sheet, V and shoulder", () => {
    const sizes = fc.record({ opening: between(4, 200), times: between(5, 16), radiusPart: between(0.02, 0.2), shoulderPart: between(0.02, 0.12), turned: between(5, 150), spare: between(1, 20), named: fc.constantFrom("tops", "corners") });
    fc.assert(fc.property(sizes, ({ opening, times, radiusPart, shoulderPart, turned, spare, named }) => {
      const die: DrawnDie = { named, opening, shoulderRadius: shoulderPart * opening, dieAngle: (Math.max(5, 180 - turned - spare) * Math.PI) / 180 };
      // The formulas hold while the plane wing touches the shoulder, not the round of the bend.
      fc.pre(flangeAtContact(toRad(deg(turned)), openingOf(die)) > apexSetback(toRad(deg(turned)), mm(radiusPart * opening), mm(opening / times)));
      const [depth, flange] = compare({ angle: (turned * Math.PI) / 180, insideRadius: radiusPart * opening, thickness: opening / times }, die);
      expect(depth).toBeLessThan(1e-5);
      expect(flange).toBeLessThan(2e-3);
    }), { numRuns: 40 });
  });
});

describe("what a V needs beside the bend line", () => {
  test("sheet that lies on its shoulder flat and holds on it formed has not left it in between", () => {
    const sizes = fc.record({ times: between(6, 12), radiusPart: between(0.1, 0.2), shoulderPart: between(0.03, 0.12), turned: between(20, 150), k: between(0.3, 0.5) });
    fc.assert(fc.property(sizes, ({ times, radiusPart, shoulderPart, turned, k }) => {
      const [opening, insideRadius] = [16, radiusPart * 16];
      const thickness = opening / times;
      const die: DrawnDie = { named: "tops", opening, shoulderRadius: shoulderPart * opening, dieAngle: 0.1 };
      /** From the bend line to the contact, along the neutral line and then along the wing. */
      const contact = (degrees: number) => {
        const angle = toRad(deg(degrees));
        const { contactFromApex } = restOnDie({ angle, insideRadius, thickness }, die);
        return bendAllowance(angle, mm(insideRadius), k, mm(thickness)) / 2 + contactFromApex - apexSetback(angle, mm(insideRadius), mm(thickness));
      };
      const needed = Math.max(opening / 2, contact(turned));
      for (let part = 0.1; part < 1; part += 0.2) expect(contact(part * turned)).toBeLessThan(needed + 2e-3 * opening);
    }), { numRuns: 15 });
  });

  test("a hole is over the opening exactly when its edge lies within the tops of the drawn shoulders", () => {
    fc.assert(fc.property(between(4, 100), between(0.02, 0.12), between(20, 90), between(-0.4, 0.4), (opening, shoulderPart, dieDegrees, off) => {
      const points = shoulderPoints({ named: "tops", opening, shoulderRadius: shoulderPart * opening, dieAngle: (dieDegrees * Math.PI) / 180 });
      const top = Math.min(...points.filter(([, y]) => y > -1e-9).map(([x]) => x));
      const edge = opening / 2 + off;
      fc.pre(Math.abs(off) > 1e-3 * opening);
      expect(holeOverDie(mm(edge), mm(opening))).toBe(edge < top);
    }), { numRuns: 25 });
  });

  test("a square hole is too near exactly when, folded to 90 degrees, its edge is nearer than 1.5 T + R to the inside of the other leg", () => {
    fc.assert(fc.property(between(0.8, 4), between(0.8, 2.5), between(0.6, 2.4), (thickness, radiusTimes, gapTimes) => {
      fc.pre(Math.abs(gapTimes - 1.5) > 0.01);
      const insideRadius = thickness * radiusTimes;
      const near = thickness + insideRadius + gapTimes * thickness;
      const document: PartDocument = {
        format: "part/1", name: "hole", units: "mm", material: "S235", thickness, insideRadius,
        base: { outline: [[0, 0], [200, 0], [200, 120], [0, 120]], holes: [{ polygon: [[96, near], [104, near], [104, near + 8], [96, near + 8]] }] },
        flanges: [{ id: "front", on: "base", edge: 0, length: 60, angle: 90, direction: "up" }],
      };
      const part = mustBuild(document);
      const [base, leg] = foldFrames(part, part.bends.map(({ angle }) => angle));
      const inside = (part.faces[1]?.outline ?? []).map(([x, y]): Vec3 => (leg ? applyFrame(leg, [x, y, thickness]) : [NaN, NaN, NaN]));
      // The leg stands upright on the base's x: its inside is one plane of y.
      const plane = inside.map(([, y]) => y);
      expect(Math.max(...plane) - Math.min(...plane)).toBeLessThan(1e-9);
      const edge = (part.faces[0]?.holes[0] ?? []).map(([x, y]) => (base ? applyFrame(base, [x, y, thickness])[1] : NaN));
      const distance = Math.min(...edge) - (plane[0] ?? NaN);
      const tooNear = found(document, "hole").some(({ severity }) => severity === "caution");
      expect([tooNear, distance.toFixed(4)]).toEqual([distance < 1.5 * thickness + insideRadius, (insideRadius + gapTimes * thickness).toFixed(4)]);
    }), { numRuns: 60 });
  });
});
