import { SAME_POINT_MM } from "../core/tolerance";
import { mm, rad, type Mm, type Rad } from "../core/units";
import type { Interval } from "../geometry/interval";
import { intersectIntervals } from "../geometry/intersectIntervals";
import { mergeIntervals } from "../geometry/mergeIntervals";
import type { Machine } from "../tooling/machine";
import type { Die, Punch } from "../tooling/tool";
import { accessShapes, type AccessMotion, type AccessShapes } from "./accessMotion";
import type { ClearanceHit } from "./clearance";
import type { Shape } from "./convexPiece";
import { createKeys } from "./createKeys";
import type { Obstacles } from "./createObstacles";
import type { FaceMeeting, HitTable } from "./hitTable";
import { NO_MEETING, type Meeting } from "./meeting";
import { meetStroke } from "./meetStroke";
import type { Obstacle } from "./obstacle";
import { strokePlacement } from "./strokePlacement";

/** Getting the flat part in (at angle 0) and the formed part out (at the end of the stroke). */
export interface Access {
  /** What a tool is met by on the best way in and on the best way out. */
  meetings(table: HitTable, formed: number, punch: Punch, die: Die, obstacle: Obstacle, end: Rad): readonly FaceMeeting[];
  /** Evidence that there is no way in or out; empty when there is one. */
  trapped(table: HitTable, formed: number, punch: Punch, die: Die, end: Rad): readonly ClearanceHit[];
}

interface Way {
  readonly motion: AccessMotion | null;
  readonly blocking: readonly FaceMeeting[];
}

const EVERYWHERE: Interval = [-1e6, 1e6];

/**
 * Straight motions are tried in turn (see `AccessMotion`); the first that leaves the whole bend line free for punch and die,
 * with ram and bed clear, is taken, else the one that leaves most of it. Sound: a part that only a turn or a tilt would free
 * counts as trapped.
 */
export function createAccess(thickness: Mm, machine: Machine, margin: Mm, obstacles: Obstacles, count: () => void): Access {
  const situations = new WeakMap<object, AccessSituation>();
  const shapes = new WeakMap<object, AccessShapes>();
  const keys = createKeys();

  const situationOf = (table: HitTable, punch: Punch, die: Die, angle: Rad): AccessSituation => {
    const key = keys(table, punch, die, angle);
    const known = situations.get(key);
    if (known) return known;
    const { depth, tipHeight } = strokePlacement(table.bend, thickness, die, angle);
    const opening = Math.max(0, Math.min(machine.stroke, machine.daylight - punch.height - die.height - tipHeight));
    const made = { angle, tipHeight, opening, motions: motionsFor(depth + 2 * margin, opening - 2 * margin), ways: new Map<number, Way>() };
    situations.set(key, made);
    return made;
  };
  const met = (table: HitTable, formed: number, at: AccessSituation, obstacle: Obstacle, motion: AccessMotion): readonly FaceMeeting[] => {
    const base = obstacle.on === "ram" ? obstacle.lift : obstacle.lift - at.tipHeight;
    const place = keys(obstacle, motion.kind, motion.lift, base, at.opening);
    let passing = shapes.get(place);
    if (!passing) {
      passing = accessShapes(motion, obstacle, base, at.opening, margin);
      shapes.set(place, passing);
    }
    const { everywhere, passed } = passing;
    return table.ask(keys(passing, at.angle), formed, (path, plates): Meeting => {
      const meet = (shape: Shape): Meeting => shape.length === 0 ? NO_MEETING : meetStroke({
        bend: table.bend, thickness, plates, inFront: path.inFront, shape, lift: () => 0, from: at.angle / 2, to: at.angle / 2, steps: 0, margin, count,
      });
      const anywhere = meet(everywhere);
      return anywhere.intervals.length ? { ...anywhere, intervals: [EVERYWHERE] } : meet(passed);
    });
  };
  const way = (table: HitTable, formed: number, punch: Punch, die: Die, at: AccessSituation): Way => {
    const state = formed & allBends(table);
    const kept = at.ways.get(state);
    if (kept) return kept;
    const tools = [obstacles.ofTool(punch, punch, die), obstacles.ofTool(die, punch, die)];
    const fixed = [obstacles.ram(punch), obstacles.bed(die)];
    const found = findWay(at.motions, table.lines, (motion, of) => (of === "tools" ? tools : fixed).flatMap((thing) => met(table, formed, at, thing, motion)));
    at.ways.set(state, found);
    return found;
  };
  return {
    meetings: (table, formed, punch, die, obstacle, end) => [rad(0), end].flatMap((angle) => {
      const at = situationOf(table, punch, die, angle);
      const { motion } = way(table, formed, punch, die, at);
      return motion ? met(table, formed, at, obstacle, motion) : [];
    }),
    trapped: (table, formed, punch, die, end) => [rad(0), end].flatMap((angle) => {
      const { motion, blocking } = way(table, formed, punch, die, situationOf(table, punch, die, angle));
      return motion ? [] : trappedHits(blocking, angle);
    }),
  };
}

/** One moment with one pair of tools: what does not depend on the other bends. */
interface AccessSituation {
  readonly angle: Rad;
  readonly tipHeight: number;
  readonly opening: number;
  readonly motions: readonly AccessMotion[];
  readonly ways: Map<number, Way>;
}

function allBends(table: HitTable): number {
  return table.paths.reduce((mask, path) => mask | path.mask, 0);
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

function findWay(motions: readonly AccessMotion[], lines: readonly Interval[], meet: (motion: AccessMotion, of: "tools" | "machine") => readonly FaceMeeting[]): Way {
  const length = measure(lines);
  let best: { readonly motion: AccessMotion; readonly covered: number } | null = null;
  const blocking: FaceMeeting[] = [];
  for (const motion of motions) {
    const fixed = meet(motion, "machine");
    const tools = fixed.length ? [] : meet(motion, "tools");
    const covered = fixed.length ? length : measure(intersectIntervals(mergeIntervals(tools.flatMap(({ meeting }) => meeting.intervals)), mergeIntervals(lines)));
    if (covered === 0) return { motion, blocking: [] };
    if (covered < length - SAME_POINT_MM && (!best || covered < best.covered)) best = { motion, covered };
    blocking.push(...tools, ...fixed);
  }
  return best ? { motion: best.motion, blocking: [] } : { motion: null, blocking };
}

const measure = (intervals: readonly Interval[]): number => intervals.reduce((sum, [from, to]) => sum + to - from, 0);

const NEED = "the part comes off neither towards the operator with the ram up nor along the bed; a shorter or a relieved punch, more daylight, or a later place in the order would help";

function trappedHits(blocking: readonly FaceMeeting[], angle: Rad): readonly ClearanceHit[] {
  const [first] = blocking;
  if (!first) return [];
  const mask = blocking.reduce((bits, { path }) => bits | path.mask, 0);
  const value = blocking.reduce((bits, { state }) => bits | state, 0);
  const last = first.meeting.intervals[first.meeting.intervals.length - 1];
  return [{
    kind: "trapped",
    face: first.path.face,
    otherFace: null,
    tool: null,
    strokeAngle: angle,
    depth: mm(first.meeting.depth),
    z: [first.meeting.intervals[0]?.[0] ?? 0, last?.[1] ?? 0],
    mask,
    value,
    need: NEED,
  }];
}
