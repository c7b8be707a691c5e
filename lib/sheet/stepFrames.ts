import type { Rad } from "@/bending/core/units";
import { machineFrames } from "@/bending/clearance/machineFrames";
import { applyFrame } from "@/bending/geometry/applyFrame";
import { composeFrames } from "@/bending/geometry/composeFrames";
import type { Frame } from "@/bending/geometry/frame";
import { identityFrame } from "@/bending/geometry/identityFrame";
import type { FormedAngles } from "@/bending/part/partModel";
import { zonePoint } from "./bendPrisms";
import type { PlanModel, StepModel } from "./planModel";

/** Where everything stands at one moment of a stroke, in the machine's frame with z from the middle of the bed. */
export interface StrokeMoment {
  readonly frames: readonly Frame[];
  readonly angles: FormedAngles;
  /** Height of the punch's tip: it rests on the inside of the bend. */
  readonly tipHeight: number;
}

/** The sheet and the punch at a stroke angle (radians turned through) of a step. */
export function stepFrames(model: PlanModel, step: StepModel, strokeAngle: number): StrokeMoment {
  const middle = (step.bendZ[0] + step.bendZ[1]) / 2;
  const shift: Frame = { ...identityFrame, o: [0, 0, middle] };
  const frames = machineFrames(model.part, step.hit, strokeAngle as Rad, step.punch, step.die).map((frame) => composeFrames(shift, frame));
  const angles = step.formed.map((angle, bend) => (step.hit.bends.includes(bend) ? strokeAngle : angle));
  return { frames, angles, tipHeight: insideOfBend(model, step, frames, strokeAngle) };
}

function insideOfBend(model: PlanModel, step: StepModel, frames: readonly Frame[], angle: number): number {
  const bend = model.part.bends[step.hit.bends[0] ?? 0];
  const parent = bend && frames[bend.parent];
  if (!bend || !parent) return 0;
  const z = bend.direction === "up" ? model.part.thickness : 0;
  return applyFrame(parent, zonePoint(bend, model.part.thickness, angle, 0.5, false, z))[1];
}
