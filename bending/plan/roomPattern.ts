import type { StrokeMeeting } from "../clearance/clearance";
import { bitCount } from "../order/bitCount";
import type { BlockedPattern } from "../order/createFacts";
import { freeShifts } from "../setup/freeShifts";

/** A run that has to stand while the stroke is made, and what it meets in the stroke. */
export interface StandingRun {
  readonly length: number;
  readonly met: readonly StrokeMeeting[];
}

/** Every state in which runs find no room on the bed for the same few meetings as in this one; null when those of the stroke itself leave room. */
export function roomPattern(reach: number, runs: readonly StandingRun[], formed: number): BlockedPattern | null {
  const met = runs.flatMap((run) => run.met.map((meeting) => ({ run, meeting }))).sort((a, b) => bitCount(a.meeting.mask) - bitCount(b.meeting.mask));
  const room = (kept: readonly (typeof met)[number][]) =>
    freeShifts(reach, kept.map(({ run, meeting }) => ({ offset: 0, length: run.length, forbidden: meeting.intervals }))).length > 0;
  let kept: (typeof met)[number][] = [];
  for (const one of met) {
    kept.push(one);
    if (!room(kept)) break;
  }
  if (room(kept)) return null;
  for (const one of [...kept].reverse()) {
    const fewer = kept.filter((other) => other !== one);
    if (!room(fewer)) kept = fewer;
  }
  const mask = kept.reduce((all, { meeting }) => all | meeting.mask, 0);
  return { mask, value: formed & mask };
}
