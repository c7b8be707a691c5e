import type { PlanModel, StepModel } from "./planModel";

/**
 * Which side of the sheet is up in a step. T is the base's top, U its underside, both carried along the unfolded
 * sheet. A stroke turns the wings upwards, so a bend that is "up" is made with T up. Letters that no station has: stations are A, B, C.
 */
export function upSide(model: PlanModel, step: StepModel): "T" | "U" {
  return model.part.bends[step.hit.bends[0] ?? 0]?.direction === "down" ? "U" : "T";
}
