import { readdirSync, readFileSync } from "node:fs";
import path from "node:path";
import { beforeAll, describe, expect, it } from "vitest";
import { machineFrames, type Clearance } from "@/bending";
import type { FixedCase } from "./caseOf";
import { bodyDistance, convexDistance } from "./convexDistance";
import { judgeCase } from "./judgeCase";
import { createJudge } from "./judgeSeed";
import { createModeller, type Modeller } from "./modeller";
import { move, type Point } from "./placing";
import { placePart } from "./placePart";
import { createRandom, type Random } from "./random";
import { scenesOf } from "./scene";
import { countOf, emptyTally } from "./tally";

let modeller: Modeller;
beforeAll(async () => {
  modeller = await createModeller();
});

describe("the checker itself", () => {
  it("folds and places parts, its own way, where the product draws them", () => {
    let compared = 0;
    for (let seed = 1; seed <= 60; seed++) {
      const random = createRandom(seed);
      for (const { part, hit, punch, die, demanded } of scenesOf(random).filter((_, i) => i % 12 === 0)) {
        const angle = random.pick([0, demanded, random.number(0, demanded)]);
        const placed = placePart(part, hit, die, angle);
        if (!placed) continue;
        const frames = machineFrames(part, hit, angle as typeof demanded, punch, die);
        part.faces.forEach((face, i) => {
          const [x, y] = face.outline[0] ?? [0, 0];
          const mine = move(placed.faces[i] ?? [], [x, y, part.thickness]);
          const frame = frames[i];
          if (!frame) throw new Error("a frame for every face");
          const theirs = [0, 1, 2].map((k) => (frame.x[k] ?? 0) * x + (frame.y[k] ?? 0) * y + (frame.z[k] ?? 0) * part.thickness + (frame.o[k] ?? 0));
          mine.forEach((value, k) => expect(Math.abs(value - (theirs[k] ?? 0)), `seed ${seed}`).toBeLessThan(1e-6));
          compared++;
        });
      }
    }
    expect(compared).toBeGreaterThan(500);
  });

  it("measures distances as the modeller does, and meets what the modeller meets", () => {
    let [apart, together] = [0, 0];
    for (let seed = 1; seed <= 300; seed++) {
      const random = createRandom(seed);
      const [a, b] = [plate(random), plate(random)];
      const profile = Array.from({ length: 5 }, (_, i): [number, number] => [20 * Math.cos((2 * Math.PI * i) / 5), 30 * Math.sin((2 * Math.PI * i) / 5)]);
      const [from, lift] = [random.number(-80, 40), random.number(-40, 40)];
      const flat = (points: readonly Point[]) => Float64Array.from(points.flat());
      const [solidA, solidB, bar] = [modeller.hulls([a]), modeller.hulls([b]), modeller.bar([profile], lift, from, from + 50)];
      const questions = [
        [solidB, bodyDistance(flat(a), flat(b), Infinity)],
        [bar, convexDistance(flat(a), lift, { profile: Float64Array.from(profile.flat()), from, to: from + 50, sweepX: 0, sweepY: 0 }, Infinity)],
      ] as const;
      for (const [other, distance] of questions) {
        const volume = modeller.shared(solidA, other);
        if (distance > 0) {
          apart++;
          expect(volume).toBeLessThan(1e-6);
          expect(solidA.minGap(other, 400)).toBeCloseTo(distance, 3);
        } else {
          together++;
          expect(volume).toBeGreaterThan(0);
        }
      }
      for (const solid of [solidA, solidB, bar]) solid.delete();
    }
    expect(Math.min(apart, together)).toBeGreaterThan(100);
  });

  it("notices answers that are wrong: nothing forbidden, nothing blocked, intervals too short, everything forbidden", { timeout: 600_000 }, () => {
    const wrong = (seeds: number, told: (clearance: Clearance) => Clearance) => {
      const [judge, tally] = [createJudge(modeller, told), emptyTally()];
      for (let seed = 1; seed <= seeds; seed++) judge(seed, tally);
      return tally;
    };
    const careless = wrong(5, (clearance) => ({ ...clearance, forbidden: () => [], blocked: () => [] }));
    for (const question of ["punch", "die", "other", "ram", "bed", "self", "way"] as const) expect(careless[question].falseFeasible, question).toBeGreaterThan(0);
    const short = wrong(2, (clearance) => ({ ...clearance, forbidden: (...asked) => clearance.forbidden(...asked).map(([from, to]) => [from + 3, to - 3] as const) }));
    expect(short.punch.falseFeasible + short.die.falseFeasible + short.other.falseFeasible).toBeGreaterThan(0);
    const anxious = wrong(2, (clearance) => ({ ...clearance, forbidden: () => [[-1e6, 1e6]] }));
    expect(countOf(anxious, "falseInfeasible") + countOf(anxious, "choice")).toBeGreaterThan(0);
  });

  const cases = path.join(__dirname, "cases");
  for (const file of readdirSync(cases)) {
    it(`finds nothing falsely feasible in ${file}`, () => {
      const { verdicts } = judgeCase(modeller, JSON.parse(readFileSync(path.join(cases, file), "utf8")) as FixedCase);
      expect(verdicts.length).toBeGreaterThanOrEqual(7);
      expect(verdicts.flatMap(({ outcome, finding }) => (outcome === "falseFeasible" ? [finding] : []))).toEqual([]);
    });
  }
});

/** A plate of any size, anywhere, turned anyhow. */
function plate(random: Random): readonly Point[] {
  const [half, thick] = [[random.number(2, 60), random.number(2, 60)] as const, random.number(0.5, 6)];
  const [p, q, r] = [random.number(0, 6.3), random.number(0, 6.3), random.number(0, 6.3)];
  const at: Point = [random.number(-60, 60), random.number(-60, 60), random.number(-60, 60)];
  const turn = ([x, y, z]: Point): Point => {
    const [x1, y1] = [x * Math.cos(p) - y * Math.sin(p), x * Math.sin(p) + y * Math.cos(p)];
    const [y2, z2] = [y1 * Math.cos(q) - z * Math.sin(q), y1 * Math.sin(q) + z * Math.cos(q)];
    return [x1 * Math.cos(r) - z2 * Math.sin(r) + at[0], y2 + at[1], x1 * Math.sin(r) + z2 * Math.cos(r) + at[2]];
  };
  return [-1, 1].flatMap((i) => [-1, 1].flatMap((j) => [0, thick].map((z) => turn([i * half[0], j * half[1], z]))));
}
