import { describe, expect, it } from "vitest";
import { deg, kiloNewtonPerMetre, mm, mpa, toRad } from "../core/units";
import type { BendNeed } from "./bendNeed";
import { candidateDies } from "./candidateDies";
import { pairMisfits } from "./pairMisfits";
import type { Machine } from "./machine";
import type { Die, Punch } from "./tool";

const common = { profile: [], height: mm(100), maxForcePerMetre: kiloNewtonPerMetre(1000), tang: "20 mm", pieces: [] };
const punch: Punch = { ...common, id: "P88", name: "P88", kind: "punch", tipAngle: toRad(deg(88)), tipRadius: mm(0.8) };
const die = (vOpening: number): Die => ({ ...common, id: `V${vOpening}`, name: "", kind: "die", vOpening: mm(vOpening), vAngle: toRad(deg(86)), shoulderRadius: mm(1.5) });
const need: BendNeed = {
  thickness: mm(2), tensile: mpa(510), naturalRadiusRatio: 0.16, demandedAngle: toRad(deg(90)), insideRadius: mm(2.56), radiusAllowance: mm(0.5), shortestFlange: mm(20),
};
const kinds = (p: Punch, d: Die, n: BendNeed) => pairMisfits(p, d, n).map(({ kind, tool }) => `${kind} ${tool}`);

describe("pairMisfits", () => {
  it("finds nothing wrong with V 16 for 2 mm", () => expect(pairMisfits(punch, die(16), need)).toEqual([]));

  it.each([
    ["a V over 20 thicknesses", punch, die(50), need, ["v-opening V50", "radius V50", "flange V50"]],
    ["a V under 5 thicknesses", punch, die(8), need, ["v-opening V8", "radius V8"]],
    ["an angle over the tools'", punch, die(16), { ...need, demandedAngle: toRad(deg(95)) }, ["punch-angle P88", "die-angle V16"]],
    ["a blunt tip", { ...punch, tipRadius: mm(3) }, die(16), need, ["tip-radius P88"]],
    ["a short flange", punch, die(16), { ...need, shortestFlange: mm(9) }, ["flange V16"]],
    ["a weak punch", { ...punch, maxForcePerMetre: kiloNewtonPerMetre(100) }, die(16), need, ["force P88"]],
  ] as const)("names %s", (_, p, d, n, expected) => expect(kinds(p, d, n)).toEqual(expected));

  it("gives the numbers: force by Oehler's form, least flange by the two tangencies", () => {
    const weak = pairMisfits({ ...punch, maxForcePerMetre: kiloNewtonPerMetre(100) }, die(16), { ...need, tensile: mpa(450), shortestFlange: mm(9) });
    expect(weak.find(({ kind }) => kind === "force")).toMatchObject({ needs: 168.75, rating: 100 });
    const flange = weak.find((misfit) => misfit.kind === "flange");
    expect(flange?.kind === "flange" && flange.least).toBeCloseTo(9.814, 3);
  });

  it("lists dies nearest to the usual V first, and only what the machine holds", () => {
    const machine = { punchTang: "20 mm", dieTang: "20 mm" } as Machine;
    const dies = [die(16), die(12), { ...die(14), tang: "60 mm" }];
    expect(candidateDies([punch, ...dies], machine, { ...need, radiusAllowance: null }).map(({ id }) => id)).toEqual(["V12", "V16"]);
  });
});
