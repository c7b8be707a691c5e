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
  const shapes = new Map<string, AccessShapes>();
  const ways = new WeakMap<HitTable, Map<string, Way>>();

  const poseOf = (table: HitTable, punch: Punch, die: Die, angle: Rad) => {
    const { depth, tipHeight } = strokePlacement(table.bend, thickness, die, angle);
    return { depth, tipHeight, opening: Math.max(0, Math.min(machine.stroke, machine.daylight - punch.height - die.height - tipHeight)) };
  };
  const met = (table: HitTable, formed: number, punch: Punch, die: Die, obstacle: Obstacle, angle: Rad, motion: AccessMotion): readonly FaceMeeting[] => {
    const { tipHeight, opening } = poseOf(table, punch, die, angle);
    const base = obstacle.on === "ram" ? obstacle.lift : obstacle.lift - tipHeight;
    const key = `${motion.kind}/${motion.lift}/${obstacle.key}/${base}/${opening}/${angle}`;
    const passing = shapes.get(key) ?? accessShapes(motion, obstacle, base, opening, margin);
    shapes.set(key, passing);
    return table.ask(key, formed, (path, prisms): Meeting => {
      const at = (shape: Shape): Meeting => shape.length === 0 ? NO_MEETING : meetStroke({
        bend: table.bend, thickness, prisms, inFront: path.inFront, shape, lift: () => 0, from: angle / 2, to: angle / 2, steps: 0, margin, count,
      });
      const everywhere = at(passing.everywhere);
      return everywhere.intervals.length ? { ...everywhere, intervals: [EVERYWHERE] } : at(passing.passed);
    });
  };
  const way = (table: HitTable, formed: number, punch: Punch, die: Die, angle: Rad): Way => {
    const known = ways.get(table) ?? new Map<string, Way>();
    ways.set(table, known);
    const key = `${obstacles.number(punch)}/${obstacles.number(die)}/${angle}/${formed & allBends(table)}`;
    const kept = known.get(key);
    if (kept) return kept;
    const found = findWay(poseOf(table, punch, die, angle), margin, table.lines, (motion) => ({
      tools: [obstacles.ofTool(punch, punch, die), obstacles.ofTool(die, punch, die)].flatMap((tool) => met(table, formed, punch, die, tool, angle, motion)),
      machine: [obstacles.ram(punch), obstacles.bed(die)].flatMap((thing) => met(table, formed, punch, die, thing, angle, motion)),
    }));
    known.set(key, found);
    return found;
  };
  return {
    meetings: (table, formed, punch, die, obstacle, end) => [rad(0), end].flatMap((angle) => {
      const { motion } = way(table, formed, punch, die, angle);
      return motion ? met(table, formed, punch, die, obstacle, angle, motion) : [];
    }),
    trapped: (table, formed, punch, die, end) => [rad(0), end].flatMap((angle) => {
      const { motion, blocking } = way(table, formed, punch, die, angle);
      return motion ? [] : trappedHits(blocking, angle);
    }),
  };
}

function allBends(table: HitTable): number {
  return table.paths.reduce((mask, path) => mask | path.mask, 0);
}

function findWay(
  pose: { readonly depth: number; readonly opening: number },
  margin: Mm,
  lines: readonly Interval[],
  meet: (motion: AccessMotion) => { readonly tools: readonly FaceMeeting[]; readonly machine: readonly FaceMeeting[] },
): Way {
  const lift = pose.depth + 2 * margin;
  const high = pose.opening - 2 * margin;
  const lifts = [lift, high].filter((by, i) => by >= lift && by <= high && (i === 0 || by > lift));
  const motions: readonly AccessMotion[] = [
    ...lifts.map((by): AccessMotion => ({ kind: "pull", lift: by })),
    ...lifts.map((by): AccessMotion => ({ kind: "slide", lift: by })),
    { kind: "closed", lift: 0 },
  ];
  const length = measure(lines);
  let best: { readonly motion: AccessMotion; readonly covered: number } | null = null;
  const blocking: FaceMeeting[] = [];
  for (const motion of motions) {
    const { tools, machine } = meet(motion);
    const covered = machine.length ? length : measure(intersectIntervals(mergeIntervals(tools.flatMap(({ meeting }) => meeting.intervals)), mergeIntervals(lines)));
    if (covered === 0 && !machine.length) return { motion, blocking: [] };
    if (covered < length - SAME_POINT_MM && (!best || covered < best.covered)) best = { motion, covered };
    blocking.push(...tools, ...machine);
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
