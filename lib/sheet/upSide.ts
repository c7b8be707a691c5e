import type { PlanModel, StepModel } from "./planModel";

/**
 * Which side of the sheet is up in a step. TOP is the base's top, UNDER its underside, both carried along the unfolded
 * sheet. A stroke turns the wings upwards, so a bend that is "up" is made with TOP up. Words, since letters name stations (A, B) and bend ways (U, D).
 */
export function upSide(model: PlanModel, step: StepModel): "TOP" | "UNDER" {
  return model.part.bends[step.hit.bends[0] ?? 0]?.direction === "down" ? "UNDER" : "TOP";
}
