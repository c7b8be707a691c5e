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

/** A table for one hit. A face's place depends only on the bends on its path, so answers are kept by those bits alone. */
export function hitTable(part: PartModel, hit: Hit, bend: Bend, pieces: readonly (readonly (readonly Vec2[])[])[], count: () => void): HitTable {
  const paths = facePaths(part, hit);
  const made = paths.map(() => new Map<number, Plates>());
  const answers = new Map<object, Map<number, FaceMeeting>[]>();
  const platesAt = (i: number, path: FacePath, state: number): Plates => {
    const known = made[i]?.get(state);
    if (known) return known;
    const plates = platesOf(prismsOf(part, path, state, pieces[path.face] ?? []));
    made[i]?.set(state, plates);
    return plates;
  };
  return {
    bend,
    paths,
    lines: hit.bends.flatMap((which) => lineOf(part, paths, which)),
    plates: (path, formed) => platesAt(paths.indexOf(path), path, formed & path.mask),
    ask: (key, formed, answer) => {
      let columns = answers.get(key);
      if (!columns) {
        columns = paths.map(() => new Map<number, FaceMeeting>());
        answers.set(key, columns);
      }
      const met: FaceMeeting[] = [];
      for (let i = 0; i < paths.length; i++) {
        const path = paths[i] as FacePath;
        const state = formed & path.mask;
        let known = columns[i]?.get(state);
        if (!known) {
          count();
          known = { path, state, meeting: answer(path, platesAt(i, path, state)) };
          columns[i]?.set(state, known);
        }
        if (known.meeting.intervals.length) met.push(known);
      }
      return met;
    },
  };
}

function lineOf(part: PartModel, paths: readonly FacePath[], which: number): readonly Interval[] {
  const line = paths.find((path) => path.line.index === which)?.line;
  const ends = (part.bends[which]?.line ?? []).map(([x, y]) => (line ? line.along[0] * x + line.along[1] * y - line.middle : 0));
  return ends.length ? [[Math.min(...ends), Math.max(...ends)]] : [];
}
