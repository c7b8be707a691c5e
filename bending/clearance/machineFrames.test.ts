import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { rad } from "../core/units";
import { applyFrame } from "../geometry/applyFrame";
import type { Vec3 } from "../geometry/vec3";
import { machineFrames } from "./machineFrames";
import { strokePlacement } from "./strokePlacement";
import { createDice, profilePart, randomPart, trayPart } from "./trial/trialParts";
import { straightPunch, vDie } from "./trial/trialTools";

const punch = straightPunch("P88");
const die = vDie("V16");
const cross = (a: Vec3, b: Vec3): Vec3 => [a[1] * b[2] - a[2] * b[1], a[2] * b[0] - a[0] * b[2], a[0] * b[1] - a[1] * b[0]];

describe("machineFrames", { timeout: 120_000 }, () => {
  it("turns the part without mirroring it, puts the front face in front, and lays both wings on the shoulder circles", () => {
    fc.assert(fc.property(fc.integer({ min: 1, max: 5000 }), fc.double({ min: 0, max: 1, noNaN: true }), (seed, share) => {
      const dice = createDice(seed);
      const part = randomPart(dice);
      const index = Math.floor(dice(0, part.bends.length - 1e-9));
      const bend = part.bends[index];
      if (!bend) return;
      const angle = rad(bend.angle * share);
      const formed = Math.floor(dice(0, 2 ** part.bends.length)) & ~(1 << index);
      for (const front of [bend.parent, bend.child]) {
        const frames = machineFrames(part, { bends: [index], front, formed }, angle, punch, die);
        for (const face of [bend.parent, bend.child]) {
          const frame = frames[face];
          if (!frame) continue;
          const [x, y, z] = cross(frame.x, frame.y);
          expect(Math.hypot(x - frame.z[0], y - frame.z[1], z - frame.z[2])).toBeLessThan(1e-9);
          const side = face === front ? -1 : 1;
          const outside = bend.direction === "up" ? 0 : part.thickness;
          const ends = (face === bend.parent ? [bend.zone[0], bend.zone[3]] : [bend.zone[1], bend.zone[2]]).map((p) => applyFrame(frame, [p[0], p[1], outside]));
          const normal: Vec3 = bend.direction === "up" ? frame.z : [-frame.z[0], -frame.z[1], -frame.z[2]];
          expect(normal[1]).toBeGreaterThan(0.7);
          const centre = [side * (die.vOpening / 2), -die.shoulderRadius];
          for (const [px, py] of ends) {
            expect(side * px).toBeGreaterThan(0);
            const off = ((centre[0] ?? 0) - px) * normal[0] + ((centre[1] ?? 0) - py) * normal[1];
            expect(off).toBeCloseTo(-die.shoulderRadius, 9);
          }
        }
      }
    }), { numRuns: 300 });
  });

  it("lies flat on the die's top plane before the stroke, its middle at z = 0", () => {
    const part = trayPart(30, 0);
    const frames = machineFrames(part, { bends: [1], front: 0, formed: 0 }, rad(0), punch, die);
    const corners = part.faces.flatMap((face, i) => face.outline.map((p) => applyFrame(frames[i] ?? frames[0]!, [p[0], p[1], 0])));
    for (const [, y] of corners) expect(y).toBeCloseTo(0, 9);
    const line = part.bends[1]?.line.map((p) => applyFrame(frames[0]!, [p[0], p[1], 0])) ?? [];
    expect((line[0]?.[2] ?? 1) + (line[1]?.[2] ?? 1)).toBeCloseTo(0, 9);
  });

  it("turns the part over for a bend down", () => {
    const part = profilePart([30, 60, 30], [90, -90]);
    const over = machineFrames(part, { bends: [1], front: 1, formed: 0 }, rad(0), punch, die);
    const straight = machineFrames(part, { bends: [0], front: 0, formed: 0 }, rad(0), punch, die);
    expect(over[1]?.z[1]).toBeCloseTo(-1, 12);
    expect(straight[1]?.z[1]).toBeCloseTo(1, 12);
  });
});

describe("strokePlacement", () => {
  it("gives the depth of the closed form for V 16, t 2, R 2.6667, rd 1.5 (derived values, bending handbook page)", () => {
    const part = profilePart([60, 60], [90]);
    const bend = part.bends[0];
    if (!bend) return;
    for (const [included, depth] of [[150, 1.9261], [135, 2.8056], [120, 3.6648], [90, 5.4457], [60, 7.6897]] as const) {
      const angle = rad(((180 - included) * Math.PI) / 180);
      const drawn = { ...bend, allowance: ((8 / 3 + bend.k * 2) * angle) as typeof bend.allowance };
      expect(strokePlacement(drawn, part.thickness, vDie("V16"), angle).depth).toBeCloseTo(depth, 3);
    }
  });

  it("starts at 0, without a step", () => {
    const bend = profilePart([60, 60], [90]).bends[0]!;
    const at = (angle: number) => strokePlacement(bend, profilePart([60, 60], [90]).thickness, die, rad(angle)).depth;
    expect(at(0)).toBe(0);
    expect(at(1e-7)).toBeCloseTo(0, 5);
    expect(Math.abs(at(2.1e-9) - at(1.9e-9))).toBeLessThan(1e-8);
  });
});
