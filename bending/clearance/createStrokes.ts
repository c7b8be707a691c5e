import type { Mm, Rad } from "../core/units";
import type { Machine } from "../tooling/machine";
import type { Die, Punch, Tool } from "../tooling/tool";
import { createAsks, type Asked } from "./createAsks";
import type { HitPlace } from "./createHitPlaces";
import { createMoment, type Moment } from "./createMoment";
import { createObstacles } from "./createObstacles";
import { meetOwnZone } from "./meetOwnZone";
import type { Counts } from "./question";
import { createUsual, type Usual } from "./createUsual";
import { NO_MEETING, type Meeting } from "./meeting";

/** A tool on the bed while a hit is made. */
export interface Standing {
  readonly asked: Asked;
  /** What the bend zone in the making meets of it. */
  readonly zone: Meeting;
}

/** A hit made with one punch and one die, whatever else is formed. */
export interface Stroke {
  readonly end: Rad;
  readonly ram: Asked;
  readonly bed: Asked;
  readonly moments: readonly Moment[];
  readonly standing: (tool: Tool) => Standing;
  /** Does a half meet nothing of punch, die, ram and bed in the stroke? */
  readonly usual: { readonly front: Usual; readonly back: Usual };
}

export interface StrokeFacts {
  readonly machine: Machine;
  readonly margin: Mm;
  readonly demanded: (bend: number, die: Die) => Rad;
  readonly counts: Counts;
}

/** Everything that does not depend on what else is formed, each worked out once. */
export function createStrokes({ machine, margin, demanded, counts }: StrokeFacts): (place: HitPlace, bend: number, punch: Punch, die: Die) => Stroke {
  const obstacles = createObstacles(machine, margin);
  const asks = createAsks(margin, counts);
  const strokes = new WeakMap<HitPlace, Map<Punch, Map<Die, Stroke>>>();

  const makeStroke = (place: HitPlace, bend: number, punch: Punch, die: Die): Stroke => {
    const end = demanded(bend, die);
    const standing = new Map<Tool, Standing>();
    const moment = (angle: Rad) => createMoment({ halves: place, punch, die, angle, machine, margin, obstacles, asks });
    const own = [obstacles.ofTool(punch, punch, die), obstacles.ofTool(die, punch, die), obstacles.ram(punch), obstacles.bed(die)];
    const asked = own.map((obstacle) => asks.stroke(place, obstacle, die, end));
    return {
      end,
      ram: asks.stroke(place, obstacles.ram(punch), die, end),
      bed: asks.stroke(place, obstacles.bed(die), die, end),
      moments: [moment(0 as Rad), moment(end)],
      usual: { front: createUsual(asked.map(({ front }) => front)), back: createUsual(asked.map(({ back }) => back)) },
      standing: (tool) => {
        const known = standing.get(tool);
        if (known) return known;
        const obstacle = obstacles.ofTool(tool, punch, die);
        const makes = tool === punch || tool === die || tool.id === punch.id || tool.id === die.id;
        const made = { asked: asks.stroke(place, obstacle, die, end), zone: makes ? NO_MEETING : meetOwnZone(place.back, die, obstacle, end, margin) };
        standing.set(tool, made);
        return made;
      },
    };
  };
  return (place, bend, punch, die) => {
    const ofPlace = strokes.get(place) ?? new Map<Punch, Map<Die, Stroke>>();
    strokes.set(place, ofPlace);
    const ofPunch = ofPlace.get(punch) ?? new Map<Die, Stroke>();
    ofPlace.set(punch, ofPunch);
    const stroke = ofPunch.get(die) ?? makeStroke(place, bend, punch, die);
    ofPunch.set(die, stroke);
    return stroke;
  };
}


