import { beforeAll, describe, expect, it } from "vitest";
import { mm, type Rad } from "../core/units";
import { MEANT_CONTACT_MM } from "../core/tolerance";
import { applyFrame } from "../geometry/applyFrame";
import type { Frame } from "../geometry/frame";
import { convexPieces } from "../geometry/convexPieces";
import type { Interval } from "../geometry/interval";
import type { Vec3 } from "../geometry/vec3";
import { bendFacets } from "../part/bendFacets";
import type { PartModel } from "../part/partModel";
import type { Punch, Tool } from "../tooling/tool";
import { clipPrism, type Clipped } from "./clipPrism";
import { dieShape } from "./dieShape";
import { createBendShapes } from "./createBendShapes";
import { createHalf } from "./createHalf";
import { facesOf } from "./facesOf";
import { posePrism } from "./posePrism";
import { POSE_NUMBERS } from "./strokeMotion";
import { writePose } from "./writePose";
import { punchShape } from "./punchShape";
import { createClearance } from "./createClearance";
import { machineFrames, type Hit } from "./machineFrames";
import { strokePlacement } from "./strokePlacement";
import { createDice, randomPart } from "./trial/trialParts";
import { createSolids, type Solids } from "./trial/solids";
import { relievedPunch, straightPunch, trialMachine, vDie } from "./trial/trialTools";

let solids: Solids;
beforeAll(async () => {
  solids = await createSolids();
});

const dies = [vDie("V12", 12, 60, 30), vDie("V16"), vDie("V16-tall", 16, 90, 60), vDie("V20", 20, 60, 50)];
const punches: readonly Punch[] = [straightPunch("P88"), straightPunch("P85-slim", 85, 120, 12), relievedPunch("R-front", "front"), relievedPunch("R-back", "back"), straightPunch("P86-short", 86, 80, 20)];

const clipped: Clipped = { separation: 0, from: 0, to: 0 };
const pick = <T,>(list: readonly T[], dice: (from: number, to: number) => number): T => list[Math.floor(dice(0, list.length - 1e-9))] as T;

interface Case {
  readonly part: PartModel;
  readonly hit: Hit;
  readonly punch: Punch;
  readonly die: (typeof dies)[number];
  readonly obstacle: Tool;
}

function randomCase(seed: number): Case {
  const dice = createDice(seed);
  const part = randomPart(dice);
  const bend = Math.floor(dice(0, part.bends.length - 1e-9));
  const made = part.bends[bend];
  const [punch, die] = [pick(punches, dice), pick(dies, dice)];
  const hit: Hit = { bends: [bend], front: (dice(0, 1) < 0.5 ? made?.parent : made?.child) ?? 0, formed: Math.floor(dice(0, 2 ** part.bends.length)) & ~(1 << bend) };
  return { part, hit, punch, die, obstacle: dice(0, 1) < 0.6 ? (dice(0, 1) < 0.6 ? punch : die) : pick<Tool>([...punches, ...dies], dice) };
}

/** Solids of faces and formed bend zones at one moment, but the zone in the making. */
function partSolids(c: Case, angle: Rad) {
  const frames = machineFrames(c.part, c.hit, angle, c.punch, c.die);
  const at = (i: number) => frames[i] as Frame;
  const faces = c.part.faces.map((face, i) => solids.plate(face.outline, face.holes, c.part.thickness, at(i)));
  const zones = c.part.bends.flatMap((bend, i) => {
    if (c.hit.bends.includes(i)) return [];
    const formed = (c.hit.formed >> i) & 1 ? bend.angle : 0;
    return bendFacets(c.part, i, formed, 6).map((facet) => solids.hull([...facet.inside, ...facet.outside].map((p) => applyFrame(at(bend.parent), p))));
  });
  return [...faces, ...zones];
}

function liftOf(c: Case, angle: Rad): number {
  const bend = c.part.bends[c.hit.bends[0] ?? 0];
  if (!bend) return 0;
  const { tipHeight } = strokePlacement(bend, c.part.thickness, c.die, angle);
  return c.obstacle.kind === "punch" ? tipHeight + c.punch.height - c.obstacle.height : c.obstacle.height - c.die.height;
}

const covers = (intervals: readonly Interval[], [from, to]: readonly [number, number]) => intervals.some(([a, b]) => a <= from + 1e-4 && b >= to - 1e-4);

describe("the clip against a solid modeller", () => {
  it("never finds clear what the solids say is hit, in 500 random cases with 4 moments each", { timeout: 600_000 }, () => {
    const falseClear: unknown[] = [];
    let hits = 0;
    let moments = 0;
    for (let seed = 1; seed <= 500; seed++) {
      const c = randomCase(seed);
      const end = (c.part.bends[c.hit.bends[0] ?? 0]?.angle ?? 0) as Rad;
      const forbidden = createClearance(c.part, trialMachine).forbidden(c.hit, c.punch, c.die, c.obstacle);
      const dice = createDice(seed + 100_000);
      for (const share of [0, 1, dice(0, 1), dice(0.6, 1)]) {
        moments++;
        const angle = (end * share) as Rad;
        const bar = solids.bar(c.obstacle.profile, -MEANT_CONTACT_MM - 0.01, liftOf(c, angle));
        for (const solid of partSolids(c, angle)) {
          const both = solids.shared(solid, bar);
          solid.delete();
          if (!both || both.volume < 1e-7) continue;
          hits++;
          if (!covers(forbidden, both.z)) falseClear.push({ seed, share, z: both.z, volume: both.volume, forbidden });
        }
        bar.delete();
      }
    }
    expect(falseClear).toEqual([]);
    expect(moments).toBe(2000);
    expect(hits).toBeGreaterThan(500);
  });

  it("gives the z-extent of the solids, the margin kept between 1 and 1.083 of what is asked, plate by plate", { timeout: 600_000 }, () => {
    let [compared, met, clear] = [0, 0, 0];
    for (let seed = 1; seed <= 600; seed++) {
      const c = randomCase(seed);
      const dice = createDice(seed + 200_000);
      const pieces = c.part.faces.map((face) => convexPieces(face.outline, face.holes));
      const half = createHalf(c.part, c.hit.bends, c.hit.front, pieces, createBendShapes(c.part));
      const bend = half.bend;
      const h = dice(0, bend.angle / 2);
      const prism = pick(pick(facesOf(half.at(c.hit.formed)), dice).plates().all, dice);
      const placed = new Float64Array(prism.points.length);
      const pose = new Float64Array(POSE_NUMBERS);
      writePose(bend, c.part.thickness, null, h, pose, 0);
      posePrism(prism.points, pose, 0, dice(0, 1) < 0.5, placed);
      const solid = solids.hull(Array.from({ length: prism.count * 2 }, (_, i): Vec3 => [placed[3 * i] ?? 0, placed[3 * i + 1] ?? 0, placed[3 * i + 2] ?? 0]));
      const lift = liftOf(c, (2 * h) as Rad) - strokePlacement(bend, c.part.thickness, c.die, (2 * h) as Rad).tipHeight;
      for (const piece of c.obstacle.kind === "punch" ? punchShape(c.obstacle, mm(1)) : dieShape(c.obstacle, mm(1))) {
        clipPrism(placed, prism.count, piece.withMargin.planes, lift, clipped);
        const [least, most] = [0.9995, 1.083].map((grow) => {
          const bar = solids.bar(piece.corners, grow, lift);
          const both = solids.shared(solid, bar);
          bar.delete();
          return both && both.volume > 1e-7 ? both.z : null;
        });
        compared++;
        const hit = clipped.separation <= 0 && clipped.from <= clipped.to;
        if (hit) met++; else clear++;
        if (least) expect(hit && clipped.from <= least[0] + 1e-4 && clipped.to >= least[1] - 1e-4, `seed ${seed}`).toBe(true);
        if (hit) expect(most && most[0] <= clipped.from + 1e-4 && most[1] >= clipped.to - 1e-4, `seed ${seed}`).toBe(true);
      }
      solid.delete();
    }
    expect(compared).toBeGreaterThan(1200);
    expect(Math.min(met, clear)).toBeGreaterThan(150);
  });
});
