import { createClearance, rad, type Clearance, type Die, type Hit, type Interval, type Machine, type PartDocument, type PartModel, type Punch, type Rad, type Tool } from "@/bending";
import type { Random } from "./random";
import { randomPart } from "./randomPart";
import { randomDie, randomMachine, randomPunch } from "./randomTools";

export interface Stroke {
  readonly bends: readonly number[];
  readonly front: number;
  readonly punch: Punch;
  readonly die: Die;
}

/** One stroke on one part with tools: everything that the product is asked about. */
export interface Scene {
  /** The same object for all states of one stroke. */
  readonly stroke: Stroke;
  readonly document: PartDocument;
  readonly part: PartModel;
  readonly machine: Machine;
  readonly clearance: Clearance;
  readonly hit: Hit;
  readonly punch: Punch;
  readonly die: Die;
  /** A tool of another station. */
  readonly other: Tool;
  readonly demanded: Rad;
}

/** What the product says about the scene, and where the tools are taken to stand. */
export interface Answers {
  readonly blocked: ReturnType<Clearance["blocked"]>;
  readonly standing: readonly { readonly tool: Tool; readonly role: "punch" | "die" | "other"; readonly at: Interval; readonly forbidden: readonly Interval[]; readonly free: boolean }[];
}

/** Strokes looked at of each part, and states of its other bends for each. */
const STROKES_A_PART = 4;
const STATES_A_STROKE = 12;

/** The scenes of one part, of which those of one stroke stand together; the same for the same seed. */
export function scenesOf(random: Random): readonly Scene[] {
  const { document, part } = randomPart(random);
  const machine = randomMachine(random);
  const over = random.pick([0, 0, 0.02, 0.06]);
  const dies = [randomDie(random, part.thickness), randomDie(random, part.thickness)] as const;
  const demandedOf = (bend: number): Rad => rad(Math.min(Math.PI - 0.02, (part.bends[bend]?.angle ?? 0) * (1 + over)));
  const clearance = createClearance(part, machine, { demandedAngle: demandedOf });
  const strokes = strokesOf(part);
  const sharpest = 180 - Math.max(...part.bends.map((bend) => (bend.angle * 180) / Math.PI));
  const punches = [randomPunch(random, sharpest), randomPunch(random, sharpest)] as const;
  return Array.from({ length: STROKES_A_PART }).flatMap(() => {
    const bends = random.pick(strokes);
    const bend = part.bends[bends[0] ?? 0];
    const front = (random.chance(0.5) ? bend?.parent : bend?.child) ?? 0;
    const [punch, die] = [random.pick(punches), random.pick(dies)];
    const others = [random.pick(punches), random.pick(dies)] as const;
    const share = random.pick([0.2, 0.5, 0.8, 1]);
    const stroke: Stroke = { bends, front, punch, die };
    return Array.from({ length: STATES_A_STROKE }, (_, k): Scene => {
      const formed = part.bends.reduce((mask, __, i) => (!bends.includes(i) && random.chance(k === 0 ? 1 : share) ? mask | (1 << i) : mask), 0);
      return { document, part, machine, clearance, punch, die, stroke, hit: { bends, front, formed }, other: random.pick<Tool>(others), demanded: demandedOf(bends[0] ?? 0) };
    });
  });
}

/** Every bend alone, and bends of one parent that lie on one line and are alike together. */
function strokesOf(part: PartModel): readonly (readonly number[])[] {
  const alone = part.bends.map((_, i) => [i]);
  const together = part.bends.flatMap((bend, i) => {
    const on = (p: readonly [number, number]) => {
      const [[ax, ay], [bx, by]] = bend.line;
      return Math.abs((p[0] - ax) * (by - ay) - (p[1] - ay) * (bx - ax)) / Math.hypot(bx - ax, by - ay) < 1e-3;
    };
    const alike = part.bends.flatMap((other, j) => (j >= i && other.parent === bend.parent && other.direction === bend.direction && Math.abs(other.angle - bend.angle) < 1e-9
      && Math.abs(other.allowance - bend.allowance) < 1e-6 && other.line.every(on) ? [j] : []));
    return alike.length > 1 ? [alike, alike] : [];
  });
  return [...alone, ...together];
}

const LONG = 5000;

/** Where a tool stands: near to an end of a stretch that is forbidden to it, on the bend line, or anywhere along the part. */
function place(random: Random, forbidden: readonly Interval[], line: Interval, part: Interval): Interval {
  const length = random.pick([10, 20, 50, 100, 300]);
  if (forbidden.length > 0 && random.chance(0.5)) {
    const [from, to] = random.pick(forbidden);
    const off = random.pick([0.001, 0.001, random.number(0, 2), random.number(-3, 3)]);
    if (random.chance(0.5) && to < LONG) return [to + off, to + off + length];
    if (from > -LONG) return [from - off - length, from - off];
  }
  if (random.chance(0.6)) return [line[0] - random.number(0, 4), line[1] + random.number(0, 4)];
  const from = random.number(part[0] - 20, part[1]);
  return [from, from + length];
}

/** Asks the product; the tools' places are drawn once it is known where they may stand, unless they are given. */
export function answersTo(scene: Scene, random: Random, line: Interval, extent: Interval, places: readonly Interval[] = []): Answers {
  const { clearance, hit, punch, die, other } = scene;
  const things = [{ tool: punch, role: "punch" }, { tool: die, role: "die" }, { tool: other, role: "other" }] as const;
  return {
    blocked: clearance.blocked(hit, punch, die),
    standing: things.map(({ tool, role }, i) => {
      const forbidden = clearance.forbidden(hit, punch, die, tool);
      const at = places[i] ?? place(random, forbidden, line, extent);
      return { tool, role, at, forbidden, free: forbidden.every(([from, to]) => at[1] <= from || at[0] >= to) };
    }),
  };
}
