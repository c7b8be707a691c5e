import { handbookFor } from "./handbookFor";
import type { MaterialLookup } from "@/bending/handbook/material";
import type { ShopCell } from "@/bending/shopTable/shopCell";
import type { ValueState } from "@/lib/schemas/bendTableInputs";
import type { ValueItem } from "@/lib/schemas/bendTableViews";

/** A cell of the bend table beside what the handbook says. */
export function valueItem(cell: ShopCell, materials: MaterialLookup): ValueItem {
  const material = materials(cell.material);
  const handbook = material === undefined ? null : handbookFor(cell, material);
  const { value } = cell;
  return {
    key: cell.key,
    material: cell.material,
    thicknessMm: cell.thickness,
    vOpeningMm: cell.vOpening,
    punchRadiusMm: cell.punchRadius,
    angleDeg: cell.angle,
    anglesDeg: cell.angles,
    radiusMm: cell.radius,
    radiusSource: cell.radiusSource,
    state: stateOf(cell),
    counted: value?.count ?? 0,
    excluded: cell.trials.filter(({ excluded }) => excluded !== null).length,
    outliers: cell.trials.filter(({ outlier }) => outlier).length,
    deductionMm: value?.deduction.value ?? null,
    expandedMm: value?.deduction.expanded ?? null,
    k: value?.k ?? null,
    spreadMm: value?.spread ?? null,
    lastMeasured: value?.lastMeasured ?? null,
    handbookMm: handbook?.deduction ?? null,
  };
}

function stateOf({ value, trials }: ShopCell): ValueState {
  if (value === null) return "none";
  if (trials.some(({ outlier }) => outlier)) return "outlier";
  return value.count < 3 ? "few" : "ok";
}
