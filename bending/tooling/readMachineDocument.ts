import type { FieldProblem } from "../core/problem";
import { fail, ok, type Result } from "../core/result";
import { deg, kiloNewton, mm, mmPer, toRad, type Mm } from "../core/units";
import { signedArea } from "../geometry/signedArea";
import type { ProfilePoint } from "../geometry/vec2";
import { documentProblems } from "./documentProblems";
import type { BackGauge, Machine, MachineSettings, MachineTimes } from "./machine";
import { machineDefaults } from "./machineDefaults";
import type { MachineDocument } from "./machineDocument";
import { machineProblems } from "./machineProblems";
import { machineSchema } from "./machineSchema";

/** The machine of a machine document (`machine/1`), or every field that keeps it from being read. */
export function readMachineDocument(json: unknown): Result<Machine, readonly FieldProblem[]> {
  const read = machineSchema.safeParse(json);
  if (!read.success) return fail(documentProblems(read.error));
  const document: MachineDocument = read.data;
  const scale = mmPer(document.units);
  const machine: Machine = {
    name: document.name,
    bedLength: mm(document.bedLength * scale),
    betweenFrames: mm(document.betweenFrames * scale),
    maxForce: kiloNewton(document.maxForce),
    daylight: mm(document.daylight * scale),
    stroke: mm(document.stroke * scale),
    throatDepth: mm(document.throatDepth * scale),
    punchTang: document.punchTang,
    dieTang: document.dieTang,
    ramProfile: profile(document.ramProfile, scale),
    bedProfile: profile(document.bedProfile, scale),
    gauge: gauge(document, scale),
    settings: settings(document, scale),
    times: times(document),
  };
  const problems = machineProblems(machine, document.units);
  return problems.length ? fail(problems) : ok(machine);
}

function profile(points: readonly (readonly [number, number])[], scale: number): readonly ProfilePoint[] {
  const drawn = points.map(([x, y]): ProfilePoint => [x * scale, y * scale]);
  return signedArea(drawn) > 0 ? drawn : [...drawn].reverse();
}

function gauge({ gauge: given }: MachineDocument, scale: number): BackGauge {
  const range = ([from, to]: readonly [number, number]): readonly [Mm, Mm] => [mm(from * scale), mm(to * scale)];
  return {
    fingers: given.fingers,
    independent: given.independent,
    x: range(given.x),
    r: range(given.r),
    z: range(given.z),
    minSpread: mm(given.minSpread * scale),
    fingerProfile: profile(given.fingerProfile, scale),
    fingerWidth: mm(given.fingerWidth * scale),
  };
}

function settings({ settings: given }: MachineDocument, scale: number): MachineSettings {
  const defaults = machineDefaults.settings;
  const length = (value: number | undefined, millimetres: number): Mm => mm(value === undefined ? millimetres : value * scale);
  return {
    clearance: length(given?.clearance, defaults.clearance),
    maxSectionGap: length(given?.maxSectionGap, defaults.maxSectionGap),
    maxUncoveredEnd: length(given?.maxUncoveredEnd, defaults.maxUncoveredEnd),
    angleRepeat: toRad(deg(given?.angleRepeat ?? defaults.angleRepeat)),
    gaugeRepeat: length(given?.gaugeRepeat, defaults.gaugeRepeat),
    ...(given?.offCentre ? { offCentre: given.offCentre.map(([distance, share]) => [mm(distance * scale), share] as const) } : {}),
  };
}

function times({ times: given }: MachineDocument): MachineTimes {
  const defaults = machineDefaults.times;
  return {
    flip: given?.flip ?? defaults.flip,
    turn: given?.turn ?? defaults.turn,
    walkPerMetre: given?.walkPerMetre ?? defaults.walkPerMetre,
    stroke: given?.stroke ?? defaults.stroke,
    gaugeMove: given?.gaugeMove ?? defaults.gaugeMove,
    stationSetup: given?.stationSetup ?? defaults.stationSetup,
    sectionPlace: given?.sectionPlace ?? defaults.sectionPlace,
  };
}
