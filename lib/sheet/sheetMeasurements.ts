import { mmPer } from "@/bending/core/units";
import type { PartDocument } from "@/bending/part/partDocument";
import type { PlanDocument } from "@/bending/plan/planDocument";
import { createSheetFormat, type SheetFormat } from "./createSheetFormat";
import { GENERAL_TOLERANCE, generalTolerance } from "./generalTolerance";
import { measuredLengths } from "./measuredLengths";
import type { PlanModel } from "./planModel";
import type { PlanSource, SheetMeasurement } from "./sheetView";
import { shorterSide } from "./shorterSide";

/** What to measure on the first part: every angle after its step, then the lengths that the document states. */
export function sheetMeasurements({ document, plan }: PlanSource, model: PlanModel): readonly SheetMeasurement[] {
  return [...angles(document, model), ...lengths(document, plan, model)];
}

function angles(document: PartDocument, model: PlanModel): readonly SheetMeasurement[] {
  const format = createSheetFormat(model.units);
  return model.steps.flatMap((step, index) =>
    step.hit.bends.flatMap((bendIndex, place): SheetMeasurement[] => {
      const bend = model.part.bends[bendIndex];
      const id = step.step.bends[place];
      // Of a bend that several strokes make, the whole angle is measured after the last of them; a hem lies flat.
      const goesOn = step.step.hit !== undefined && model.steps.slice(index + 1).some((later) => later.step.bends.includes(id ?? ""));
      if (!bend || id === undefined || goesOn || step.step.acuteAngle !== undefined) return [];
      const own = bend.toleranceAngle !== null ? (bend.toleranceAngle * 180) / Math.PI : (document.toleranceAngle ?? null);
      const tolerance = own ?? generalTolerance("angle", shorterSide(model.part, bendIndex)) ?? 1;
      const included = 180 - step.step.angle * (step.step.hit?.of ?? 1);
      const digits = (value: number): string => `${value.toFixed(2)}°`;
      return [{
        what: `Included angle at ${id}`,
        kind: "angle",
        nominal: format.angle(included),
        tolerance: `±${digits(tolerance)}`,
        low: digits(included - tolerance),
        high: digits(included + tolerance),
        source: own === null ? GENERAL_TOLERANCE : "part document",
        afterStep: index + 1,
      }];
    }),
  );
}

function lengths(document: PartDocument, plan: PlanDocument, model: PlanModel): readonly SheetMeasurement[] {
  const format = createSheetFormat(model.units);
  const per = mmPer(document.units);
  return measuredLengths(document).flatMap(({ what, length, tolerance: stated, face }): SheetMeasurement[] => {
    const size = length * per;
    const own = stated ?? document.toleranceLength ?? null;
    const tolerance = own === null ? generalTolerance("length", size) : own * per;
    if (tolerance === null) return [];
    return [{
      what,
      kind: "length",
      nominal: format.fine(size),
      tolerance: `±${format.fine(tolerance)}`,
      low: format.fine(size - tolerance),
      high: format.fine(size + tolerance),
      source: own === null ? GENERAL_TOLERANCE : "part document",
      afterStep: null,
      ...expectedOf(plan, face, per, format),
    }];
  });
}

/** What the steps of the plan let a face's own length miss. */
function expectedOf(plan: PlanDocument, face: string | null, per: number, format: SheetFormat): Pick<SheetMeasurement, "expected"> {
  const found = plan.tolerances?.find((one) => one.kind === "leg" && one.face === face && (one.from === face || face === "base"));
  return typeof found?.worstCase === "number" ? { expected: `±${format.fine(found.worstCase * per)}` } : {};
}
