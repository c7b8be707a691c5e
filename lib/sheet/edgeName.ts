import type { PlanModel, StepModel } from "./planModel";

/** Names the edge at the gauge in words; a four-sided flange has a far edge and two sides, anything else a number. */
export function edgeName(model: PlanModel, step: StepModel): string {
  const face = model.part.faces[step.gaugeFace];
  if (!face) return "";
  const flange = face.bend !== null && face.outline.length === 4;
  const names = ["bend edge", "end side", "far edge", "start side"];
  return `${face.id}, ${flange ? (names[step.gaugeEdge] ?? `edge ${step.gaugeEdge}`) : `edge ${step.gaugeEdge}`}`;
}
