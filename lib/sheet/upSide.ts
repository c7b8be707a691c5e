import type { PlanModel, StepModel } from "./planModel";

/**
 * Which side of the sheet is up in a step. Side A is the base's top, side B its underside, both carried along the unfolded
 * sheet. A stroke turns the wings upwards, so a bend that is "up" is made with side A up.
 */
export function upSide(model: PlanModel, step: StepModel): "A" | "B" {
  return model.part.bends[step.hit.bends[0] ?? 0]?.direction === "down" ? "B" : "A";
}
