import { mmPer, type LengthUnit } from "@/bending/core/units";
import type { MaterialFacts } from "@/bending/handbook/material";
import { thicknessClass } from "@/bending/shopTable/thicknessClass";
import type { NewTrial } from "@/db/bendTrials/newTrial";
import type { TrialLineInput } from "@/lib/schemas/bendTableInputs";

/** A line as it is stored: in millimetres, filed under its nominal thickness. */
export function newTrial(line: TrialLineInput, units: LengthUnit, material: MaterialFacts): NewTrial {
  const mm = (value: number): number => value * mmPer(units);
  return {
    id: line.id,
    material: line.material,
    batch: line.batch,
    nominalThicknessMm: thicknessClass({ units, thickness: line.thickness, nominalThickness: line.nominal ?? undefined }, material.group),
    thicknessMm: mm(line.thickness),
    vOpeningMm: mm(line.vOpening),
    punchRadiusMm: mm(line.punchRadius),
    angleDeg: line.angle,
    blankMm: mm(line.blank),
    flangeAMm: mm(line.flangeA),
    flangeBMm: mm(line.flangeB),
    insideRadiusMm: line.insideRadius === null ? null : mm(line.insideRadius),
    lengthInstrumentId: line.lengthInstrument,
    thicknessInstrumentId: line.thicknessInstrument,
    angleInstrumentId: line.angleInstrument,
    radiusInstrumentId: line.radiusInstrument,
    measuredOn: line.measuredOn,
    measuredBy: line.measuredBy,
    note: line.note,
    partId: line.partId,
    sheetId: line.sheetId,
  };
}
