import { edgeName } from "./edgeName";
import type { PlanModel, StepModel } from "./planModel";
import type { SheetStep } from "./sheetView";
import { stepAbove } from "./stepAbove";
import { stepNumbers } from "./stepNumbers";
import { stepPicture } from "./stepPicture";
import { upSide } from "./upSide";

/** One row of the bend table with its two drawings. */
export function sheetStep(model: PlanModel, stepModel: StepModel, index: number): SheetStep {
  const side = upSide(model, stepModel);
  return {
    ...stepNumbers(stepModel.step, model.units),
    number: index + 1,
    upSide: side,
    up: side === "TOP" ? "top" : "underside",
    front: stepModel.step.front,
    toGauge: edgeName(model, stepModel),
    picture: stepPicture(model, stepModel),
    above: stepAbove(model, stepModel),
  };
}
