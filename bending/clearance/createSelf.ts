import type { Mm } from "../core/units";
import type { PartModel } from "../part/partModel";
import { airBend } from "./airBend";
import type { FacePath } from "./facePath";
import { fewCounts } from "./fewCounts";
import { facesOf } from "./facesOf";
import type { FaceState, Half, HalfState } from "./half";
import { lowestX } from "./lowestX";
import { NO_MEETING, type Meeting } from "./meeting";
import type { Counts } from "./question";
import { meetSelf } from "./meetSelf";

/** Two faces that meet in a stroke: z as when `one` stands at the back. */
export interface SelfMeeting {
  readonly one: FaceState;
  readonly other: FaceState;
  readonly meeting: Meeting;
}

/** The part meeting itself: the two halves of a hit, whichever is in front. */
export interface Self {
  /** The nearest faces that meet; null when none do. */
  readonly first: (one: HalfState, other: HalfState) => SelfMeeting | null;
  readonly all: (one: HalfState, other: HalfState) => readonly SelfMeeting[];
}

/** What stays on its own side of the plane through the bend line cannot meet what stays on the other: only what passes over is looked at, pair by pair. */
export function createSelf(part: PartModel, oneHalf: Half, otherHalf: Half, margin: Mm, counts: Counts): Self {
  const { bend } = oneHalf;
  const motion = airBend(bend, part.thickness, null, bend.angle, margin);
  const kept = new Map<FaceState, Map<FaceState, Meeting>>();
  const firsts = new Map<HalfState, Map<HalfState, SelfMeeting | null>>();
  const faces = new Map<FaceState, Map<HalfState, SelfMeeting | null>>();
  const nearness = new Map<HalfState | FaceState, number>();

  const ofFace = (face: FaceState): number => {
    const known = nearness.get(face) ?? lowestX(bend, part.thickness, face.bounds(), bend.angle / 2);
    nearness.set(face, known);
    return known;
  };
  const ofState = (state: HalfState): number => {
    const known = nearness.get(state) ?? Math.min(ofFace(state.last), state.before ? ofState(state.before) : Infinity);
    nearness.set(state, known);
    return known;
  };
  const pair = (one: FaceState, other: FaceState): Meeting => {
    if (ofFace(one) + ofFace(other) >= margin) return NO_MEETING;
    const [z, turned] = [one.bounds().z, other.bounds().z];
    if (z[0] + turned[0] >= margin || -turned[1] - z[1] >= margin) return NO_MEETING;
    const known = kept.get(one)?.get(other);
    if (known) return known;
    counts.entries++;
    const finished = { one: finishedState(oneHalf, one.path), other: finishedState(otherHalf, other.path) };
    const meeting = meetSelf({
      motion,
      neighbours: joins(one.path, other.path) || joins(other.path, one.path),
      front: other.plates().all,
      back: one.plates().all,
      finished: () => ({ front: finished.other.plates().all, back: finished.one.plates().all }),
      steps: fewCounts(motion.steps(one.bounds()) + motion.steps(other.bounds())),
      margin,
    });
    rowOf(kept, one).set(other, meeting);
    return meeting;
  };
  const against = (one: FaceState, other: HalfState): SelfMeeting | null => {
    if (ofFace(one) + ofState(other) >= margin) return null;
    const row = rowOf(faces, one);
    const known = row.get(other);
    if (known !== undefined) return known;
    let found = other.before ? against(one, other.before) : null;
    if (!found) {
      const meeting = pair(one, other.last);
      if (meeting !== NO_MEETING) found = { one, other: other.last, meeting };
    }
    row.set(other, found);
    return found;
  };
  const first = (one: HalfState, other: HalfState): SelfMeeting | null => {
    if (ofState(one) + ofState(other) >= margin) return null;
    const row = rowOf(firsts, one);
    const known = row.get(other);
    if (known !== undefined) return known;
    const found = (one.before ? first(one.before, other) : null) ?? against(one.last, other);
    row.set(other, found);
    return found;
  };
  return {
    first,
    all: (one, other) => facesOf(one).flatMap((face) => facesOf(other).flatMap((opposite): readonly SelfMeeting[] => {
      const meeting = pair(face, opposite);
      return meeting === NO_MEETING ? [] : [{ one: face, other: opposite, meeting }];
    })),
  };
}

function rowOf<A, B, C>(rows: Map<A, Map<B, C>>, key: A): Map<B, C> {
  const row = rows.get(key) ?? new Map<B, C>();
  rows.set(key, row);
  return row;
}

function finishedState(half: Half, path: FacePath): FaceState {
  for (let at: HalfState | null = half.at(half.mask); at; at = at.before) if (at.last.path === path) return at.last;
  throw new Error("invariant: a path of the half");
}

/** Is one face bent right off the other by the stroke? */
function joins({ face, bends, line: { bend } }: FacePath, other: FacePath): boolean {
  const ends = [bend.parent, bend.child];
  return bends.length === 0 && other.bends.length === 0 && ends.includes(face) && ends.includes(other.face);
}
