import fc from "fast-check";
import { expect, test } from "vitest";
import { buildPart, deg, materialById, mm, toRad } from "@/bending";
import { strokePlacement } from "@/bending/clearance/strokePlacement";
import { flangeAtContact } from "@/bending/handbook/flangeAtContact";
import { punchTravel } from "@/bending/handbook/punchTravel";
import type { Die } from "@/bending/tooling/tool";

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });

test("the stroke of the clearance check goes as deep and touches as far out as the handbook says", () => {
  fc.assert(fc.property(between(0.5, 4), between(6, 12), between(0.04, 0.1), between(10, 130), (thickness, times, shoulder, degrees) => {
    const opening = mm(thickness * times);
    const part = buildPart({
      format: "part/1", name: "stroke", units: "mm", material: "S235", thickness, insideRadius: opening / 6,
      profile: { width: 100, legs: [200, 200], bends: [{ angle: degrees, direction: "up" }] },
    }, { materials: materialById });
    const bend = part.ok ? part.value.bends[0] : undefined;
    if (!bend) throw new Error("the part was refused");
    const shoulderRadius = mm(shoulder * opening);
    const angle = toRad(deg(degrees));
    const placement = strokePlacement(bend, mm(thickness), { vOpening: opening, shoulderRadius } as Die, angle);
    const die = { measured: "between-tops", opening, shoulderRadius } as const;
    const radius = mm(bend.allowance / angle - bend.k * thickness);
    expect(placement.depth).toBeCloseTo(punchTravel(angle, radius, mm(thickness), die), 8);
    // From the tangent point out to the shoulder is the contact flange less the setback to the outside apex.
    const toShoulder = opening / 2 / Math.cos(angle / 2) - shoulderRadius * Math.tan(angle / 2) - (radius + thickness) * Math.tan(angle / 2);
    expect(placement.tangent[0] / Math.cos(angle / 2) + toShoulder).toBeCloseTo(flangeAtContact(angle, die), 8);
  }));
});
