import type { Interval } from "../geometry/interval";
import type { Vec2 } from "../geometry/vec2";
import type { Bend, PartModel } from "../part/partModel";
import { facePaths, type FacePath } from "./facePath";
import type { Hit } from "./hit";
import type { Meeting } from "./meeting";
import { platesOf, type Plates } from "./plates";
import { prismsOf } from "./prismsOf";

/** What one face meets: the face, the state of the bends that decide it, and the meeting. */
export interface FaceMeeting {
  readonly path: FacePath;
  readonly state: number;
  readonly meeting: Meeting;
}

/** All that was worked out about one hit (bends and front), whatever else is formed. */
export interface HitTable {
  readonly bend: Bend;
  readonly paths: readonly FacePath[];
  /** The bend lines, from the middle of the hit. */
  readonly lines: readonly Interval[];
  plates(path: FacePath, formed: number): Plates;
  /** Every face that meets something, asked once for each question (`key`) and each state of the bends on the face's path. */
  ask(key: object, formed: number, answer: (path: FacePath, plates: Plates) => Meeting): readonly FaceMeeting[];
}

/** The faces on one side of the hit (their places in `paths`), and the bends that decide how they stand. */
interface Side { readonly own: readonly number[]; readonly mask: number }
/** Answers to one question about one side: face by face, and together by the state of the side. */
interface Half { readonly columns: readonly Map<number, FaceMeeting>[]; readonly met: Map<number, readonly FaceMeeting[]> }

/** A table for one hit. A face's place depends only on the bends on its path, so answers are kept by those bits alone. */
export function hitTable(part: PartModel, hit: Hit, bend: Bend, pieces: readonly (readonly (readonly Vec2[])[])[], count: () => void): HitTable {
  const paths = facePaths(part, hit);
  const made = paths.map(() => new Map<number, Plates>());
  const answers = new Map<object, readonly Half[]>();
  const sides = [true, false].map((inFront): Side => {
    const own = paths.flatMap((path, index) => (path.inFront === inFront ? [index] : []));
    return { own, mask: own.reduce((mask, index) => mask | (paths[index]?.mask ?? 0), 0) };
  });
  const platesAt = (i: number, path: FacePath, state: number): Plates => {
    const known = made[i]?.get(state);
    if (known) return known;
    const plates = platesOf(prismsOf(part, path, state, pieces[path.face] ?? []));
    made[i]?.set(state, plates);
    return plates;
  };
  /** Front and back of a part stand as they do whatever is formed on the other side. */
  const askHalf = ({ own, mask }: Side, half: Half, formed: number, answer: (path: FacePath, plates: Plates) => Meeting): readonly FaceMeeting[] => {
    const known = half.met.get(formed & mask);
    if (known) return known;
    const met: FaceMeeting[] = [];
    own.forEach((index, column) => {
      const path = paths[index] as FacePath;
      const state = formed & path.mask;
      let one = half.columns[column]?.get(state);
      if (!one) {
        count();
        one = { path, state, meeting: answer(path, platesAt(index, path, state)) };
        half.columns[column]?.set(state, one);
      }
      if (one.meeting.intervals.length) met.push(one);
    });
    half.met.set(formed & mask, met);
    return met;
  };
  return {
    bend,
    paths,
    lines: hit.bends.flatMap((which) => lineOf(part, paths, which)),
    plates: (path, formed) => platesAt(paths.indexOf(path), path, formed & path.mask),
    ask: (key, formed, answer) => {
      let halves = answers.get(key);
      if (!halves) {
        halves = sides.map(({ own }) => ({ columns: own.map(() => new Map<number, FaceMeeting>()), met: new Map<number, readonly FaceMeeting[]>() }));
        answers.set(key, halves);
      }
      const [front, back] = sides.map((side, which) => askHalf(side, (halves as readonly Half[])[which] as Half, formed, answer)) as [readonly FaceMeeting[], readonly FaceMeeting[]];
      return back.length === 0 ? front : front.length === 0 ? back : [...front, ...back];
    },
  };
}

function lineOf(part: PartModel, paths: readonly FacePath[], which: number): readonly Interval[] {
  const line = paths.find((path) => path.line.index === which)?.line;
  const ends = (part.bends[which]?.line ?? []).map(([x, y]) => (line ? line.along[0] * x + line.along[1] * y - line.middle : 0));
  return ends.length ? [[Math.min(...ends), Math.max(...ends)]] : [];
}
