import { strokePlacement } from "../clearance/strokePlacement";
import { hitSides } from "../clearance/hitSides";
import { mmPer, toDeg } from "../core/units";
import { freeIntervals } from "../geometry/freeIntervals";
import type { Interval } from "../geometry/interval";
import { handlingBetween } from "../order/handlingBetween";
import type { OrderStep } from "../order/orderProblem";
import type { Layout, PlacedStation } from "../setup/layout";
import { acuteStage } from "../strokes/acuteHem";
import type { StepChecks } from "./createStepChecks";
import { placeStep, type StepPlace } from "./placeStep";
import type { PlanGauge, PlanStep } from "./planDocument";
import { rounded } from "./rounded";
import type { Situation } from "./situation";
import { stationName } from "./stationName";
import { stepLoad } from "./stepLoad";
import { stepRoom, type StepRoom } from "./stepRoom";
import { offCentreLimit } from "../tooling/offCentre";

/** One step of the plan with every number that the sheet prints. */
export function writeStep(situation: Situation, checks: StepChecks, layout: Layout, step: OrderStep, before: OrderStep | null): PlanStep {
  const { part, machine, moves, pairs, units, fits } = situation;
  const place = placeStep(situation, checks, layout, step);
  const move = moves[step.move];
  const station = layout.stations[step.station];
  const pair = pairs[station?.pair ?? -1];
  const bend = part.bends[move?.bends[0] ?? -1];
  const fit = fits[move?.bends[0] ?? -1]?.[station?.pair ?? -1];
  if (!place || !move || !station || !pair || !bend || !fit?.ok) throw new Error("invariant: a step that was found can be made");
  const acute = bend.hem === null ? null : acuteStage(part, bend, pair.die.vOpening);
  const inUnits = (value: number) => rounded(value / mmPer(units));
  const { hitZ } = place;
  return {
    bends: move.bends.map((index) => part.bends[index]?.id ?? ""),
    front: part.faces[move.front]?.id ?? "",
    punch: pair.punch.id,
    die: pair.die.id,
    station: stationName(step.station),
    bendZ: [inUnits(hitZ - move.halfLength), inUnits(hitZ + move.halfLength)],
    angle: rounded(toDeg(bend.angle)),
    ...(acute === null ? {} : { acuteAngle: rounded(toDeg(acute.angle)) }),
    demandedAngle: rounded(toDeg(fit.demanded)),
    insideRadius: inUnits(bend.insideRadius),
    forceKN: rounded((fit.force * move.bentLength) / 1000),
    depthMm: rounded(strokePlacement(acute ?? bend, part.thickness, pair.die, fit.demanded).depth),
    toolWindow: toolWindow(checks.forbidden(step.move, step.formed, pair.index, pair.punch), station.z - hitZ, hitZ, machine.bedLength).map(inUnits) as unknown as readonly [number, number],
    ...roomOf(stepRoom(situation, checks, pair, step), inUnits),
    ...offCentreOf(situation, checks, station, step, hitZ, inUnits),
    gauge: writeGauge(situation, step, place, inUnits),
    handling: handlingBetween(before === null ? null : moves[before.move]?.pose ?? null, move.pose),
  };
}

function roomOf(room: StepRoom | null, inUnits: (value: number) => number): Pick<PlanStep, "room"> {
  const range = ([from, to]: Interval) => [inUnits(from), inUnits(to)] as const;
  return room === null ? {} : { room: { punch: range(room.punch), die: range(room.die), sheet: range(room.sheet) } };
}

/** Where the load is and what the machine bears there, when that hangs on the place. */
function offCentreOf(situation: Situation, checks: StepChecks, station: PlacedStation, step: OrderStep, hitZ: number, inUnits: (value: number) => number): Pick<PlanStep, "offCentre"> {
  if (situation.machine.settings.offCentre === undefined) return {};
  const z = hitZ + stepLoad(situation, checks, station, step).offset;
  return { offCentre: { z: inUnits(z), limitKN: rounded(offCentreLimit(situation.machine, z)) } };
}

/** The longest run of bed round the station in which the punch may stand, z from the middle of the bed. */
function toolWindow(forbidden: readonly Interval[], stationAt: number, hitZ: number, bedLength: number): Interval {
  const bed: Interval = [-bedLength / 2 - hitZ, bedLength / 2 - hitZ];
  const window = freeIntervals(bed, forbidden).find(([from, to]) => from <= stationAt && stationAt <= to) ?? bed;
  return [window[0] + hitZ, window[1] + hitZ];
}

function writeGauge({ part, moves }: Situation, step: OrderStep, { hitZ, gauge }: StepPlace, inUnits: (value: number) => number): PlanGauge {
  const move = moves[step.move];
  const fingers = gauge?.fingers ?? [];
  if (gauge === null || fingers.length === 0) {
    const sides = hitSides(part, { bends: move?.bends ?? [], front: move?.front ?? 0, formed: step.formed });
    const bend = part.bends[move?.bends[0] ?? -1];
    const behind = bend && sides[bend.parent] ? bend.child : bend?.parent ?? 0;
    return { x: 0, r: 0, fingers: [], face: part.faces[behind]?.id ?? "", edge: 0 };
  }
  const { option } = gauge;
  const at = (z: number) => option.x + option.slope * z;
  return {
    x: inUnits(Math.min(...fingers.map(at))),
    r: inUnits(option.r),
    fingers: fingers.map((z) => ({ x: inUnits(at(z)), r: inUnits(option.r), z: inUnits(hitZ + z) })),
    face: part.faces[option.face]?.id ?? "",
    edge: option.edge,
    on: option.on,
  };
}
