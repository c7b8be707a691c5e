import { SAME_POINT_MM } from "../core/tolerance";
import type { Mm, Rad } from "../core/units";
import type { Interval } from "../geometry/interval";
import { intersectIntervals } from "../geometry/intersectIntervals";
import { mergeIntervals } from "../geometry/mergeIntervals";
import type { Machine } from "../tooling/machine";
import type { Die, Punch } from "../tooling/tool";
import type { AccessMotion } from "./accessMotion";
import { askFace, askHalf, NOTHING } from "./askHalf";
import type { Asked, Asks, Halves } from "./createAsks";
import type { Obstacles } from "./createObstacles";
import { facesOf } from "./facesOf";
import type { FaceState, HalfState } from "./half";
import type { Meeting } from "./meeting";
import { createUsual, type Usual } from "./createUsual";
import type { Obstacle } from "./obstacle";
import { strokePlacement } from "./strokePlacement";

/** The two halves of a hit in a state. */
export interface HitState {
  readonly front: HalfState;
  readonly back: HalfState;
}

/** A face that is in the way of the part. */
export interface InTheWay {
  readonly face: FaceState;
  readonly inFront: boolean;
  readonly meeting: Meeting;
}

/** Getting the part in or out at one moment (flat before the stroke, or formed after it), with one pair of tools. */
export interface Moment {
  readonly angle: Rad;
  /** The way that is taken: a number for `ask`; null when the part is trapped. */
  readonly way: (state: HitState) => number | null;
  /** What an obstacle is met by on a way. */
  readonly ask: (way: number, obstacle: Obstacle) => Asked;
  /** Does the part meet nothing at all of punch, die, ram and bed on this way? */
  readonly nothing: (way: number, state: HitState) => boolean;
  /** For a trapped part, what is in its way, way by way. */
  readonly blocking: (state: HitState) => readonly InTheWay[];
}

export interface MomentFacts {
  readonly halves: Halves;
  readonly punch: Punch;
  readonly die: Die;
  readonly angle: Rad;
  readonly machine: Machine;
  readonly margin: Mm;
  readonly obstacles: Obstacles;
  readonly asks: Asks;
}

/**
 * Straight motions are tried in turn (see `AccessMotion`); the first that leaves the whole bend line free for punch and die,
 * with ram and bed clear, is taken, else the one that leaves most of it. Sound: a part that only a turn or a tilt would free
 * counts as trapped. A half leaves the line free or not whatever the other does, so that is kept half by half.
 */
export function createMoment({ halves, punch, die, angle, machine, margin, obstacles, asks }: MomentFacts): Moment {
  const { depth, tipHeight } = strokePlacement(halves.back.bend, halves.back.thickness, die, angle);
  const opening = Math.max(0, Math.min(machine.stroke, machine.daylight - punch.height - die.height - tipHeight));
  const motions = motionsFor(depth + 2 * margin, opening - 2 * margin);
  const tools = [obstacles.ofTool(punch, punch, die), obstacles.ofTool(die, punch, die)];
  const fixed = [obstacles.ram(punch), obstacles.bed(die)];
  const asked = motions.map(() => new Map<Obstacle, Asked>());
  const ask = (way: number, obstacle: Obstacle): Asked => {
    const known = asked[way]?.get(obstacle);
    if (known) return known;
    const made = asks.way(halves, obstacle, motions[way] as AccessMotion, { angle, tipHeight, opening });
    asked[way]?.set(obstacle, made);
    return made;
  };
  const lines = mergeIntervals(halves.back.lines);
  const length = measure(lines);
  const meets = (way: number, obstacle: Obstacle, { front, back }: HitState): boolean => {
    const { front: ofFront, back: ofBack } = ask(way, obstacle);
    return askHalf(ofFront, front) !== NOTHING || askHalf(ofBack, back) !== NOTHING;
  };
  const usuals = motions.map((): { readonly front: Usual; readonly back: Usual } | null => null);
  const usualOf = (way: number) => {
    const known = usuals[way];
    if (known) return known;
    const all = [...tools, ...fixed].map((thing) => ask(way, thing));
    return (usuals[way] = { front: createUsual(all.map(({ front }) => front)), back: createUsual(all.map(({ back }) => back)) });
  };
  const free = { front: motions.map((): boolean[] => []), back: motions.map((): boolean[] => []) };
  /** Does the half leave ram, bed and the whole bend line free? */
  const leavesFree = (way: number, side: "front" | "back", half: HalfState): boolean => {
    const row = free[side][way] as boolean[];
    return (row[half.index] ??= usualOf(way)[side](half) || fixed.every((thing) => askHalf(ask(way, thing)[side], half) === NOTHING)
      && tools.every((thing) => measure(intersectIntervals(askHalf(ask(way, thing)[side], half)[side], lines)) === 0));
  };
  const most = new Map<HalfState, Map<HalfState, number | null>>();
  /** The way that leaves most of the line, when none leaves all of it. */
  const mostFree = (state: HitState): number | null => {
    const row = most.get(state.front) ?? new Map<HalfState, number | null>();
    most.set(state.front, row);
    const known = row.get(state.back);
    if (known !== undefined) return known;
    let best: { readonly way: number; readonly covered: number } | null = null;
    for (let way = 0; way < motions.length; way++) {
      if (fixed.some((thing) => meets(way, thing, state))) continue;
      const covered = measure(intersectIntervals(mergeIntervals(tools.flatMap((thing) => intervalsOf(ask(way, thing), state))), lines));
      if (covered < length - SAME_POINT_MM && (!best || covered < best.covered)) best = { way, covered };
    }
    row.set(state.back, best?.way ?? null);
    return best?.way ?? null;
  };
  return {
    angle,
    ask,
    nothing: (way, { front, back }) => usualOf(way).front(front) && usualOf(way).back(back),
    way: (state) => {
      for (let way = 0; way < motions.length; way++) if (leavesFree(way, "front", state.front) && leavesFree(way, "back", state.back)) return way;
      return mostFree(state);
    },
    blocking: (state) => motions.flatMap((_, way) => {
      const met = fixed.flatMap((thing) => metBy(ask(way, thing), state));
      return met[0] ? [met[0]] : tools.flatMap((thing) => metBy(ask(way, thing), state));
    }),
  };
}

/** Where a thing must not stand because of either half. */
export function intervalsOf(asked: Asked, { front, back }: HitState): readonly Interval[] {
  return [...askHalf(asked.front, front).front, ...askHalf(asked.back, back).back];
}

/** Every face of a hit that meets the thing asked for. */
export function metBy(asked: Asked, state: HitState): readonly InTheWay[] {
  return (["front", "back"] as const).flatMap((side) => facesOf(state[side]).flatMap((face): readonly InTheWay[] => {
    const meeting = askFace(asked[side], face);
    return meeting.intervals.length ? [{ face, inFront: side === "front", meeting }] : [];
  }));
}

/** `low`: just out of the die; `high`: as far as the open ram lets it. */
function motionsFor(low: number, high: number): readonly AccessMotion[] {
  const lifts = [low, high].filter((by, i) => by >= low && by <= high && (i === 0 || by > low));
  return [
    ...lifts.map((lift): AccessMotion => ({ kind: "pull", lift })),
    ...lifts.map((lift): AccessMotion => ({ kind: "slide", lift })),
    { kind: "closed", lift: 0 },
  ];
}

const measure = (intervals: readonly Interval[]): number => intervals.reduce((sum, [from, to]) => sum + to - from, 0);
