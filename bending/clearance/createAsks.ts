import type { Mm, Rad } from "../core/units";
import type { Die } from "../tooling/tool";
import { accessShapes, type AccessMotion, type AccessSides } from "./accessMotion";
import { airBend } from "./airBend";
import { atRest } from "./atRest";
import { createKeys } from "./createKeys";
import type { Half } from "./half";
import type { Obstacle } from "./obstacle";
import type { Counts, Question } from "./question";
import type { StrokeMotion } from "./strokeMotion";

/** The two halves of a hit. */
export interface Halves {
  readonly front: Half;
  readonly back: Half;
}

/** One question to both halves. */
export interface Asked {
  readonly obstacle: Obstacle;
  readonly front: Question;
  readonly back: Question;
}

/** Makes questions; the same question of the same half is one object, so that its answers are found again. */
export interface Asks {
  /** An obstacle during the stroke to `end`. */
  readonly stroke: (halves: Halves, obstacle: Obstacle, die: Die, end: Rad) => Asked;
  /** An obstacle on a way in or out, with the part at rest at `angle`. */
  readonly way: (halves: Halves, obstacle: Obstacle, motion: AccessMotion, moment: { readonly angle: Rad; readonly tipHeight: number; readonly opening: number }) => Asked;
}

export function createAsks(margin: Mm, counts: Counts): Asks {
  const keys = createKeys();
  const questions = new WeakMap<object, Question>();
  const motions = new WeakMap<object, StrokeMotion>();
  const passings = new WeakMap<object, AccessSides>();
  const once = <T>(known: WeakMap<object, T>, key: object, make: () => T): T => {
    const found = known.get(key) ?? make();
    known.set(key, found);
    return found;
  };
  const question = (half: Half, shape: object, motion: StrokeMotion, facts: Pick<Question, "shape" | "everywhere" | "lift" | "onBed">): Question =>
    once(questions, keys(half, shape, motion, facts.lift), () => ({ index: half.nextQuestion(), ...facts, motion, margin, counts }));
  return {
    stroke: (halves, obstacle, die, end) => {
      const { bend, thickness } = halves.back;
      const onBed = obstacle.on === "bed";
      const seen = onBed ? die : null;
      const motion = once(motions, keys("stroke", bend.allowance, bend.k, seen, end), () => airBend(bend, thickness, seen, end, margin));
      const ask = (half: Half, shape: Obstacle["shape"]) => question(half, shape, motion, { shape, everywhere: null, lift: obstacle.lift, onBed });
      return { obstacle, front: ask(halves.front, obstacle.turned), back: ask(halves.back, obstacle.shape) };
    },
    way: (halves, obstacle, way, { angle, tipHeight, opening }) => {
      const { bend, thickness } = halves.back;
      const base = obstacle.on === "ram" ? obstacle.lift : obstacle.lift - tipHeight;
      const up = obstacle.on === "ram" ? opening : 0;
      const sides = once(passings, keys(obstacle.shape, way.kind, way.lift, base, up), () => accessShapes(way, obstacle, base, opening, margin));
      const motion = once(motions, keys("rest", bend.allowance, bend.k, angle), () => atRest(bend, thickness, angle));
      const ask = (half: Half, shapes: AccessSides["back"]) => question(half, shapes, motion, { shape: shapes.passed, everywhere: shapes.everywhere, lift: 0, onBed: false });
      return { obstacle, front: ask(halves.front, sides.front), back: ask(halves.back, sides.back) };
    },
  };
}
