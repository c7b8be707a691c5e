import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { mm, rad, type Mm } from "../core/units";
import { profilePart } from "./trial/trialParts";
import { vDie } from "./trial/trialTools";
import { wingPose } from "./pose";
import { strokePlacement } from "./strokePlacement";
import { strokeSamples } from "./strokeSamples";

const bend = profilePart([60, 60], [90]).bends[0]!;
const thickness = mm(2);

describe("strokeSamples", { timeout: 120_000 }, () => {
  it("lets no corner travel more than the margin between two samples, seen from the punch and from the die", () => {
    fc.assert(fc.property(
      fc.double({ min: -80, max: 400, noNaN: true }), fc.double({ min: -200, max: 200, noNaN: true }), fc.double({ min: 0.2, max: 2.4, noNaN: true }),
      fc.constantFrom(6, 16, 50), fc.double({ min: 0.3, max: 3, noNaN: true }), fc.double({ min: 0.5, max: 20, noNaN: true }),
      (a, b, angle, v, margin, radius) => {
        const drawn = { ...bend, allowance: ((radius + bend.k * thickness) * angle) as Mm };
        const die = vDie("V", v, 120, v * 3);
        for (const seen of [null, die]) {
          const steps = strokeSamples(drawn, thickness, seen, { a: [a, a], b: [b, b] }, rad(angle), mm(margin));
          const place = (h: number) => {
            const pose = wingPose(drawn, thickness, h);
            const down = seen ? strokePlacement(drawn, thickness, die, rad(2 * h)).tipHeight : 0;
            return [pose.x + a * pose.cos - b * pose.sin, pose.y + a * pose.sin + b * pose.cos + down] as const;
          };
          const fine = 8;
          for (let sample = 0; sample < steps; sample += Math.max(1, Math.floor(steps / 25))) {
            let way = 0;
            for (let k = 0; k < fine; k++) {
              const [p, q] = [place((angle / 2) * ((sample + k / fine) / steps)), place((angle / 2) * ((sample + (k + 1) / fine) / steps))];
              way += Math.hypot(q[0] - p[0], q[1] - p[1]);
            }
            expect(way).toBeLessThanOrEqual(margin * (1 + 1e-9));
          }
        }
      }), { numRuns: 200 });
  });
});
