import type { Vec2 } from "@/bending/geometry/vec2";
import type { PlanModel, StepModel } from "./planModel";
import { standsUpright } from "./standsUpright";
import { stepFrames } from "./stepFrames";

/** Names what stands at the gauge in words: the face, and which of its edges as seen from the bend that it hangs on. */
export function edgeName(model: PlanModel, step: StepModel): string {
  const face = model.part.faces[step.gaugeFace];
  if (!face) return "";
  const frame = stepFrames(model, step, 0).frames[step.gaugeFace];
  if (frame && standsUpright(frame)) return `${face.id}, outside of the flange`;
  const carrier = face.bend === null ? undefined : model.part.bends[face.bend];
  if (step.step.gauge.on === "face" && carrier?.hem && (step.formed[face.bend ?? 0] ?? 0) > 0) return `${face.id}, fold`;
  const from = face.outline[step.gaugeEdge];
  const to = face.outline[(step.gaugeEdge + 1) % face.outline.length];
  const bend = model.part.bends[face.bend ?? step.hit.bends[0] ?? 0];
  if (!from || !to || !bend) return face.id;
  return `${face.id}, ${sideOf(from, to, bend.line)}`;
}

function sideOf(from: Vec2, to: Vec2, [start, end]: readonly [Vec2, Vec2]): string {
  const line = [end[0] - start[0], end[1] - start[1]] as const;
  const edge = [to[0] - from[0], to[1] - from[1]] as const;
  const [along, across] = [line[0] * edge[0] + line[1] * edge[1], line[0] * edge[1] - line[1] * edge[0]];
  if (Math.abs(along) > Math.abs(across)) return "far edge";
  const middle = [(from[0] + to[0]) / 2 - start[0], (from[1] + to[1]) / 2 - start[1]] as const;
  return middle[0] * line[0] + middle[1] * line[1] > (line[0] ** 2 + line[1] ** 2) / 2 ? "end side" : "start side";
}
