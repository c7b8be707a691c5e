import { applyFrame } from "@/bending/geometry/applyFrame";
import type { Frame } from "@/bending/geometry/frame";
import { invertFrame } from "@/bending/geometry/invertFrame";
import type { Vec3 } from "@/bending/geometry/vec3";
import type { PlanModel, StepModel } from "./planModel";
import { stepFrames } from "./stepFrames";
import { standsUpright } from "./standsUpright";

/** The four corners of the strip that stands at the back gauge, lower ends first, in the machine's frame. */
export type GaugedEdge = readonly [Vec3, Vec3, Vec3, Vec3];

/** An edge of the sheet, or on a flange that stands upright the strip of its outside that the fingers touch. */
export function gaugedEdge(model: PlanModel, step: StepModel, frames: readonly Frame[]): GaugedEdge | null {
  const frame = frames[step.gaugeFace];
  const outline = model.part.faces[step.gaugeFace]?.outline ?? [];
  const from = outline[step.gaugeEdge];
  const to = outline[(step.gaugeEdge + 1) % Math.max(1, outline.length)];
  if (!frame || !from || !to) return null;
  const flat = stepFrames(model, step, 0).frames[step.gaugeFace];
  if (flat && standsUpright(flat)) return touchedStrip(model, step, flat, frame);
  const t = model.part.thickness;
  const at = (point: readonly [number, number], z: number): Vec3 => applyFrame(frame, [point[0], point[1], z]);
  return [at(from, 0), at(to, 0), at(to, t), at(from, t)];
}

function touchedStrip(model: PlanModel, step: StepModel, before: Frame, now: Frame): GaugedEdge {
  const corners = (model.part.faces[step.gaugeFace]?.outline ?? []).map(([x, y]) => applyFrame(before, [x, y, 0]));
  const stop = model.machine.gauge.fingerProfile.filter(([x]) => Math.abs(x) < 0.5).map(([, y]) => y);
  const high = Math.min(Math.max(...corners.map((corner) => corner[1])), step.gaugeR + Math.max(2, ...stop));
  const [left, right] = [Math.min(...corners.map((corner) => corner[2])), Math.max(...corners.map((corner) => corner[2]))];
  const carried = (point: Vec3): Vec3 => applyFrame(now, applyFrame(invertFrame(before), point));
  const x = step.gaugeX;
  return [carried([x, step.gaugeR, left]), carried([x, step.gaugeR, right]), carried([x, high, right]), carried([x, high, left])];
}
