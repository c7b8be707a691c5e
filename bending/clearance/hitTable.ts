import type { Interval } from "../geometry/interval";
import type { Vec2 } from "../geometry/vec2";
import type { Bend, PartModel } from "../part/partModel";
import { facePaths, type FacePath } from "./facePath";
import type { Hit } from "./hit";
import type { Meeting } from "./meeting";
import type { Prism } from "./prism";
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
  prisms(path: FacePath, formed: number): readonly Prism[];
  /** Every face that meets something, asked once for each question (`key`) and each state of the bends on the face's path. */
  ask(key: string, formed: number, answer: (path: FacePath, prisms: readonly Prism[]) => Meeting): readonly FaceMeeting[];
}

/** A table for one hit. A face's place depends only on the bends on its path, so answers are kept by those bits alone. */
export function hitTable(part: PartModel, hit: Hit, bend: Bend, pieces: readonly (readonly (readonly Vec2[])[])[], count: () => void): HitTable {
  const paths = facePaths(part, hit);
  const plates = paths.map(() => new Map<number, readonly Prism[]>());
  const answers = new Map<string, Map<number, FaceMeeting>[]>();
  const prismsAt = (i: number, path: FacePath, state: number): readonly Prism[] => {
    const known = plates[i]?.get(state);
    if (known) return known;
    const made = prismsOf(part, path, state, pieces[path.face] ?? []);
    plates[i]?.set(state, made);
    return made;
  };
  return {
    bend,
    paths,
    lines: hit.bends.flatMap((which) => lineOf(part, paths, which)),
    prisms: (path, formed) => prismsAt(paths.indexOf(path), path, formed & path.mask),
    ask: (key, formed, answer) => {
      const columns = answers.get(key) ?? paths.map(() => new Map<number, FaceMeeting>());
      answers.set(key, columns);
      const met: FaceMeeting[] = [];
      paths.forEach((path, i) => {
        const state = formed & path.mask;
        let known = columns[i]?.get(state);
        if (!known) {
          count();
          known = { path, state, meeting: answer(path, prismsAt(i, path, state)) };
          columns[i]?.set(state, known);
        }
        if (known.meeting.intervals.length) met.push(known);
      });
      return met;
    },
  };
}

function lineOf(part: PartModel, paths: readonly FacePath[], which: number): readonly Interval[] {
  const line = paths.find((path) => path.line.index === which)?.line;
  const ends = (part.bends[which]?.line ?? []).map(([x, y]) => (line ? line.along[0] * x + line.along[1] * y - line.middle : 0));
  return ends.length ? [[Math.min(...ends), Math.max(...ends)]] : [];
}
