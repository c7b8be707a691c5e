import { mmPer, toRad, type Deg, type LengthUnit } from "@/bending/core/units";
import type { PartModel } from "@/bending/part/partModel";
import type { PlanReason, PlanStep } from "@/bending/plan/planDocument";
import type { Machine } from "@/bending/tooling/machine";
import type { Tool } from "@/bending/tooling/tool";
import type { PlanModel, StepModel } from "./planModel";
import type { MetAt } from "./stepPicture";

/** A stroke that cannot be made, as it is asked about. */
export interface FailedStepFacts {
  readonly part: PartModel;
  readonly machine: Machine;
  readonly tools: readonly Tool[];
  readonly units: LengthUnit;
  /** Bends made before it. */
  readonly done: readonly string[];
  readonly bends: readonly string[];
  readonly front: string;
  readonly punch: string;
  readonly die: string;
  readonly reason: PlanReason;
}

/** The moment at which a stroke meets something, to be drawn. */
export interface FailedStep {
  readonly model: PlanModel;
  readonly step: StepModel;
  /** Stroke angle, radians. */
  readonly angle: number;
  readonly met: MetAt;
}

/** Puts a stroke that cannot be made into the middle of the bed, nothing at the gauge; null when there is no place to show, or the names are not the part's. */
export function failedStep({ part, machine, tools, units, done, bends, front, punch: punchId, die: dieId, reason }: FailedStepFacts): FailedStep | null {
  const { evidence } = reason;
  const indices = bends.map((id) => part.bends.findIndex((bend) => bend.id === id));
  const frontFace = part.faces.findIndex(({ id }) => id === front);
  const punch = tools.find(({ id }) => id === punchId);
  const die = tools.find(({ id }) => id === dieId);
  const bend = part.bends[indices[0] ?? -1];
  if (evidence === undefined || bend === undefined || indices.includes(-1) || frontFace < 0 || punch?.kind !== "punch" || die?.kind !== "die") return null;
  const formed = part.bends.map(({ id, angle }) => (done.includes(id) ? angle : 0));
  const per = mmPer(units);
  const angle = toRad(evidence.strokeAngle as Deg);
  const step: StepModel = {
    step: planStep(bends, front, punchId, dieId, evidence.strokeAngle),
    hit: { bends: indices, front: frontFace, formed: formed.reduce((mask: number, turned, index) => (turned > 0 ? mask | (1 << index) : mask), 0) },
    formed, finished: bend.angle, demanded: angle, punch, die, station: "",
    bendZ: [0, 0], gaugeX: 0, gaugeR: 0, fingers: [], gaugeFace: -1, gaugeEdge: 0,
  };
  return {
    model: { units, part, machine, steps: [step], stations: [] }, step, angle,
    met: { plane: ((evidence.zFrom + evidence.zTo) / 2) * per, faces: reason.faces.map((id) => part.faces.findIndex((face) => face.id === id)) },
  };
}

/** The numbers of a step that never comes about: only its names are told. */
const planStep = (bends: readonly string[], front: string, punch: string, die: string, angle: number): PlanStep => ({
  bends, front, punch, die, station: "", bendZ: [0, 0], angle, demandedAngle: angle, insideRadius: 0, forceKN: 0, depthMm: 0, toolWindow: [0, 0],
  gauge: { x: 0, r: 0, fingers: [], face: front, edge: 0 }, handling: { flip: false, turn: 0 },
});
