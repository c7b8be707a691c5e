import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { deg, kiloNewtonPerMetre, mm, toRad } from "../core/units";
import { selfCrossing } from "../geometry/selfCrossing";
import { signedArea } from "../geometry/signedArea";
import { dieProblems } from "./dieProblems";
import { punchProblems } from "./punchProblems";
import { relievedPunchProfile } from "./relievedPunchProfile";
import { straightPunchProfile } from "./straightPunchProfile";
import { vDieProfile } from "./vDieProfile";

const common = { id: "T", name: "T", maxForcePerMetre: kiloNewtonPerMetre(1000), tang: "20 mm", pieces: [] };
const number = (min: number, max: number) => fc.double({ min, max, noNaN: true });

describe("profiles drawn from numbers agree with those numbers", () => {
  it("dies", () => {
    fc.assert(fc.property(number(4, 100), number(30, 92), number(0.1, 0.25), (v, angle, share) => {
      const shape = { vOpening: mm(v), vAngle: toRad(deg(angle)), shoulderRadius: mm(v * share), height: mm(v * 2.5 + 20), bodyWidth: mm(v + 20) };
      const profile = vDieProfile(shape);
      expect(selfCrossing(profile)).toBeNull();
      expect(signedArea(profile)).toBeGreaterThan(0);
      expect(dieProblems({ ...common, ...shape, kind: "die", profile }, "die", "mm")).toEqual([]);
    }));
  });

  it("straight punches", () => {
    fc.assert(fc.property(number(26, 90), number(0.2, 3), number(10, 30), (angle, tipRadius, bodyWidth) => {
      const shape = { tipAngle: toRad(deg(angle)), tipRadius: mm(tipRadius), height: mm(130), bodyWidth: mm(bodyWidth) };
      const profile = straightPunchProfile(shape);
      expect(selfCrossing(profile)).toBeNull();
      expect(signedArea(profile)).toBeGreaterThan(0);
      expect(punchProblems({ ...common, ...shape, kind: "punch", profile }, "punch", "mm")).toEqual([]);
    }));
  });

  it("relieved punches, on either side mirrored", () => {
    fc.assert(fc.property(number(80, 90), number(0.2, 2), number(4, 18), number(50, 90), (angle, tipRadius, reliefDepth, reliefHeight) => {
      const shape = { tipAngle: toRad(deg(angle)), tipRadius: mm(tipRadius), height: mm(160), bodyWidth: mm(26), reliefDepth: mm(reliefDepth), reliefHeight: mm(reliefHeight) };
      const [front, back] = [relievedPunchProfile(shape), relievedPunchProfile({ ...shape, side: "back" })];
      for (const profile of [front, back]) {
        expect(selfCrossing(profile)).toBeNull();
        expect(signedArea(profile)).toBeGreaterThan(0);
        expect(punchProblems({ ...common, ...shape, kind: "punch", profile }, "punch", "mm")).toEqual([]);
      }
      expect(new Set(back.map(([x, y]) => `${(-x).toFixed(6)},${y.toFixed(6)}`.replace("-0.000000", "0.000000")))).toEqual(new Set(front.map(([x, y]) => `${x.toFixed(6)},${y.toFixed(6)}`.replace("-0.000000", "0.000000"))));
    }));
  });
});
