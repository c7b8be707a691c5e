import { invariant } from "../core/invariant";
import type { Rad } from "../core/units";
import type { Interval } from "../geometry/interval";
import { mergeIntervals } from "../geometry/mergeIntervals";
import { turnIntervals } from "../geometry/turnIntervals";
import type { PartModel } from "../part/partModel";
import type { Machine } from "../tooling/machine";
import type { Die, Punch, Tool } from "../tooling/tool";
import { askFace, askHalf, nearestMet, NOTHING } from "./askHalf";
import type { Clearance, ClearanceHit, ClearanceOptions } from "./clearance";
import { clearanceHit } from "./clearanceHit";
import type { Asked } from "./createAsks";
import { createHitPlaces, type HitPlace } from "./createHitPlaces";
import { metBy, type HitState, type Moment } from "./createMoment";
import { createStrokes, type Stroke } from "./createStrokes";
import type { Hit } from "./hit";
import type { Counts } from "./question";
import { selfHit } from "./selfHit";
import { trappedHits } from "./trappedHits";

export type { Clearance, ClearanceHit, ClearanceOptions } from "./clearance";

/** Bends that a bit mask can tell apart. */
const MOST_BENDS = 30;
const NOWHERE: readonly Interval[] = [];
const NO_HITS: readonly ClearanceHit[] = [];

/** See README.md of this folder. Lazy: nothing is worked out before it is asked. */
export function createClearance(part: PartModel, machine: Machine, options: ClearanceOptions = {}): Clearance {
  invariant(part.bends.length <= MOST_BENDS, `clearance tells at most ${MOST_BENDS} bends apart, the part has ${part.bends.length}`);
  const margin = options.margin ?? machine.settings.clearance;
  const counts: Counts = { clips: 0, entries: 0 };
  const placeOf = createHitPlaces(part, margin, counts);
  const demanded = (bend: number, die: Die): Rad => options.demandedAngle?.(bend, die) ?? ((part.bends[bend]?.angle ?? 0) as Rad);
  const strokeOf = createStrokes({ machine, margin, demanded, counts });

  const setUp = (hit: Hit, punch: Punch, die: Die) => {
    const place = placeOf(hit);
    const state: HitState = { front: place.front.at(hit.formed), back: place.back.at(hit.formed) };
    return { place, state, stroke: strokeOf(place, hit.bends[0] ?? 0, punch, die) };
  };
  /** Nothing of punch, die, ram and bed is met in the stroke. */
  const clearStroke = ({ usual }: Stroke, { front, back }: HitState): boolean => usual.front(front) && usual.back(back);
  const forbidden = (stroke: Stroke, punch: Punch, die: Die, state: HitState, tool: Tool): readonly Interval[] => {
    const own = tool === punch || tool === die;
    const { moments, standing } = stroke;
    const { asked, zone } = standing(tool);
    let found: readonly Interval[] = zone.intervals;
    let lists = found.length ? 1 : 0;
    const add = (more: readonly Interval[]) => {
      if (more.length === 0 || more === found) return;
      found = lists++ ? [...found, ...more] : more;
    };
    const addAll = ({ front, back }: Asked) => {
      add(askHalf(front, state.front).front);
      add(askHalf(back, state.back).back);
    };
    if (!own || !clearStroke(stroke, state)) addAll(asked);
    for (const moment of moments) {
      const way = moment.way(state);
      if (way !== null && !(own && moment.nothing(way, state))) addAll(moment.ask(way, asked.obstacle));
    }
    return lists > 1 ? mergeIntervals(found) : lists ? found : NOWHERE;
  };
  const evidence = ({ moments, standing }: Stroke, place: HitPlace, state: HitState, tool: Tool): readonly ClearanceHit[] => {
    const { asked, zone } = standing(tool);
    const { obstacle } = asked;
    const met = [asked, ...moments.flatMap((moment) => {
      const way = moment.way(state);
      return way === null ? [] : [moment.ask(way, obstacle)];
    })].flatMap((one) => metBy(one, state));
    const wing = place.back.paths[0];
    return [
      ...met.map(({ face, meeting, inFront }) => clearanceHit(obstacle.kind, obstacle.tool, face, meeting, inFront)),
      ...(wing && zone.intervals.length ? [clearanceHit(obstacle.kind, obstacle.tool, { path: wing, state: 0 }, zone, false)] : []),
    ];
  };
  /** What of ram or bed the nearest face meets. */
  const fixedHit = ({ obstacle, front, back }: Asked, state: HitState): readonly ClearanceHit[] => {
    for (const [question, half, inFront] of [[front, state.front, true], [back, state.back, false]] as const) {
      const face = askHalf(question, half) === NOTHING ? null : nearestMet(question, half);
      if (face) return [clearanceHit(obstacle.kind, null, face, askFace(question, face), inFront)];
    }
    return NO_HITS;
  };
  const ofSelf = ({ oneInFront }: HitPlace, { front, back }: HitState) => (oneInFront ? [front, back] as const : [back, front] as const);
  const firstSelf = (place: HitPlace, state: HitState): readonly ClearanceHit[] => {
    const met = place.self.first(...ofSelf(place, state));
    return met ? [selfHit(met, place.oneInFront)] : NO_HITS;
  };
  const trapped = (moments: readonly Moment[], state: HitState): readonly ClearanceHit[] => {
    for (const moment of moments) if (moment.way(state) === null) return trappedHits(moment.blocking(state), moment.angle);
    return NO_HITS;
  };
  return {
    forbidden: (hit, punch, die, tool) => {
      const { state, stroke } = setUp(hit, punch, die);
      return forbidden(stroke, punch, die, state, tool);
    },
    evidence: (hit, punch, die, tool) => {
      const { place, state, stroke } = setUp(hit, punch, die);
      return evidence(stroke, place, state, tool);
    },
    inStroke: (hit, punch, die, tool) => {
      const { state, stroke } = setUp(hit, punch, die);
      return metBy(stroke.standing(tool).asked, state).map(({ face, meeting, inFront }) => ({
        intervals: inFront ? turnIntervals(meeting.intervals) : meeting.intervals, mask: face.path.mask, value: face.state,
      }));
    },
    blocked: (hit, punch, die) => {
      const { place, state, stroke } = setUp(hit, punch, die);
      return [
        ...[stroke.ram, stroke.bed].flatMap((asked) => metBy(asked, state).map(({ face, meeting, inFront }) => clearanceHit(asked.obstacle.kind, null, face, meeting, inFront))),
        ...place.self.all(...ofSelf(place, state)).map((met) => selfHit(met, place.oneInFront)),
        ...stroke.moments.flatMap((moment) => trapped([moment], state)),
      ];
    },
    firstBlock: (hit, punch, die) => {
      const { place, state, stroke } = setUp(hit, punch, die);
      if (!clearStroke(stroke, state)) {
        const fixed = fixedHit(stroke.ram, state);
        if (fixed.length > 0) return fixed;
        const below = fixedHit(stroke.bed, state);
        if (below.length > 0) return below;
      }
      const own = firstSelf(place, state);
      return own.length > 0 ? own : trapped(stroke.moments, state);
    },
    counts: () => ({ ...counts }),
  };
}
