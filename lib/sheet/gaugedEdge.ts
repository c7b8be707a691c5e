import { applyFrame } from "@/bending/geometry/applyFrame";
import type { Frame } from "@/bending/geometry/frame";
import type { Vec3 } from "@/bending/geometry/vec3";
import type { PlanModel, StepModel } from "./planModel";

/** The edge that stands at the back gauge: its ends on the lower and the upper surface, in the machine's frame. */
export function gaugedEdge(model: PlanModel, step: StepModel, frames: readonly Frame[]): readonly [Vec3, Vec3, Vec3, Vec3] | null {
  const outline = model.part.faces[step.gaugeFace]?.outline ?? [];
  const frame = frames[step.gaugeFace];
  const from = outline[step.gaugeEdge];
  const to = outline[(step.gaugeEdge + 1) % Math.max(1, outline.length)];
  if (!frame || !from || !to) return null;
  const at = (point: readonly [number, number], z: number): Vec3 => applyFrame(frame, [point[0], point[1], z]);
  const t = model.part.thickness;
  return [at(from, 0), at(to, 0), at(to, t), at(from, t)];
}
