import { mmPer, type LengthUnit } from "@/bending/core/units";
import type { PlanStep } from "@/bending/plan/planDocument";
import { createSheetFormat } from "./createSheetFormat";
import type { SheetStep } from "./sheetView";

type StepNumbers = Omit<SheetStep, "number" | "upSide" | "up" | "front" | "toGauge" | "picture" | "above">;

/** The numbers of a step as text; `units` are the plan's. */
export function stepNumbers(step: PlanStep, units: LengthUnit): StepNumbers {
  const format = createSheetFormat(units);
  const per = mmPer(units);
  const angle = step.acuteAngle ?? step.angle;
  const fingers = step.gauge.fingers.map((finger) => ({
    x: format.gauge(finger.x * per), r: format.gauge(finger.r * per), z: format.place(finger.z * per),
  }));
  return {
    bends: `${step.bends.join(" + ")}${step.hit ? `, stroke ${step.hit.number} of ${step.hit.of}` : ""}${step.acuteAngle === undefined ? "" : ", then flat in the slot"}`,
    handling: handling(step.handling),
    punch: step.punch,
    die: step.die,
    station: step.station,
    bendZ: `${format.place(step.bendZ[0] * per)} to ${format.place(step.bendZ[1] * per)}`,
    gaugeX: format.gauge(step.gauge.x * per),
    gaugeR: format.gauge(step.gauge.r * per),
    fingers,
    gaugeZ: fingers.map((finger) => finger.z).join(" / ") || "no finger",
    angle: format.angle(angle),
    includedAngle: format.angle(180 - angle),
    demandedAngle: format.angle(step.demandedAngle),
    insideRadius: format.fine(step.insideRadius * per),
    force: format.force(step.forceKN),
    // The one length of a step that a plan states in mm whatever its units are.
    depth: format.fine(step.depthMm),
  };
}

function handling({ flip, turn }: PlanStep["handling"]): string {
  const moves = [flip ? "flip over" : "", turn !== 0 ? `turn ${turn}°` : ""].filter(Boolean);
  return moves.join(", ") || "as it lies";
}
