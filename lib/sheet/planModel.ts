import { invariant } from "@/bending/core/invariant";
import { mmPer, toRad, type Deg, type LengthUnit, type Rad } from "@/bending/core/units";
import { completeMaterial } from "@/bending/handbook/completeMaterial";
import type { Hit } from "@/bending/clearance/machineFrames";
import type { FormedAngles, PartModel } from "@/bending/part/partModel";
import { plannedPart, type PlannedPart } from "@/bending/plan/plannedPart";
import type { PlanStation, PlanStep } from "@/bending/plan/planDocument";
import type { Machine } from "@/bending/tooling/machine";
import type { Die, Punch, Tool } from "@/bending/tooling/tool";
import type { PlanSource } from "./sheetView";
import { stationPieces, type StationPiece } from "./stationPieces";

/** A plan joined with its part, tools and machine; lengths in mm, angles in radians. */
export interface PlanModel {
  readonly units: LengthUnit;
  /** Every stroke a bend of its own. */
  readonly part: PartModel;
  readonly machine: Machine;
  readonly steps: readonly StepModel[];
  readonly stations: readonly StationModel[];
}

export interface StepModel {
  readonly step: PlanStep;
  readonly hit: Hit;
  /** Before the stroke. */
  readonly formed: FormedAngles;
  /** What the stroke leaves, the die's flattening of a hem not yet made. */
  readonly finished: Rad;
  readonly demanded: Rad;
  readonly punch: Punch;
  readonly die: Die;
  readonly station: string;
  readonly bendZ: readonly [number, number];
  readonly gaugeX: number;
  readonly gaugeR: number;
  readonly fingers: readonly { readonly x: number; readonly r: number; readonly z: number }[];
  readonly gaugeFace: number;
  readonly gaugeEdge: number;
}

export interface StationModel {
  readonly id: string;
  readonly punch: Punch;
  readonly die: Die;
  readonly from: number;
  readonly to: number;
  readonly pieces: readonly StationPiece[];
}

/** Joins what a plan names. The plan must come from this document and these tools: anything else is the program's fault. */
export function planModel(source: PlanSource): PlanModel {
  const { plan, tools } = source;
  const perUnit = mmPer(plan.units);
  const planned = partOf(source);
  const { part } = planned;
  const formed = part.bends.map(() => 0);
  const steps = plan.steps.map((step) => {
    const model = stepOf(step, planned, tools, [...formed], perUnit);
    for (const bend of model.hit.bends) formed[bend] = toRad(step.angle as Deg);
    return model;
  });
  const stations = plan.stations.map((station) => stationOf(station, tools, perUnit));
  return { units: plan.units, part, machine: source.machine, steps, stations };
}

function partOf({ plan, document, material }: PlanSource): PlannedPart {
  const built = plannedPart(document, (id) => (id === material.id ? completeMaterial(material) : undefined), plan);
  invariant(built.ok, "a planned part document can be built");
  return built.value;
}

function stepOf(step: PlanStep, { places }: PlannedPart, tools: readonly Tool[], formed: readonly number[], perUnit: number): StepModel {
  const { bends, front, gaugeFace, gaugeEdge } = places(step);
  invariant(bends.length > 0 && [...bends, front, gaugeFace].every((index) => index >= 0), `the bends and faces of step ${step.bends.join("+")} are the part's`);
  const mask = formed.reduce((bits, angle, bend) => (angle > 0 ? bits + 2 ** bend : bits), 0);
  return {
    step,
    hit: { bends, front, formed: mask },
    formed,
    finished: toRad((step.acuteAngle ?? step.angle) as Deg),
    demanded: toRad(step.demandedAngle as Deg),
    punch: punchOf(tools, step.punch),
    die: dieOf(tools, step.die),
    station: step.station,
    bendZ: [step.bendZ[0] * perUnit, step.bendZ[1] * perUnit],
    gaugeX: step.gauge.x * perUnit,
    gaugeR: step.gauge.r * perUnit,
    fingers: step.gauge.fingers.map((finger) => ({ x: finger.x * perUnit, r: finger.r * perUnit, z: finger.z * perUnit })),
    gaugeFace,
    gaugeEdge,
  };
}

function stationOf(station: PlanStation, tools: readonly Tool[], perUnit: number): StationModel {
  const punch = punchOf(tools, station.punch);
  const die = dieOf(tools, station.die);
  return {
    id: station.id,
    punch,
    die,
    from: station.from * perUnit,
    to: station.to * perUnit,
    pieces: [
      ...stationPieces(station.punchSections, punch, station.from * perUnit, perUnit),
      ...stationPieces(station.dieSections, die, station.from * perUnit, perUnit),
    ],
  };
}

function punchOf(tools: readonly Tool[], id: string): Punch {
  const tool = tools.find((entry) => entry.id === id && entry.kind === "punch");
  invariant(tool?.kind === "punch", `punch ${id} is among the plan's tools`);
  return tool;
}

function dieOf(tools: readonly Tool[], id: string): Die {
  const tool = tools.find((entry) => entry.id === id && entry.kind === "die");
  invariant(tool?.kind === "die", `die ${id} is among the plan's tools`);
  return tool;
}
