import { mmPer, type LengthUnit } from "../core/units";
import { scaledBasis } from "../handbook/scaledBasis";
import { flatPattern } from "../part/flatPattern";
import type { PartModel } from "../part/partModel";
import type { PlanFlat } from "./planDocument";
import { rounded } from "./rounded";

/** The flat pattern's numbers in the document's units. */
export function planFlat(part: PartModel, units: LengthUnit): PlanFlat {
  const per = mmPer(units);
  const { width, depth, area, massKg } = flatPattern(part);
  return {
    width: rounded(width / per),
    depth: rounded(depth / per),
    area: rounded(area / (per * per)),
    massKg: rounded(massKg),
    bends: part.bends.map((bend) => ({
      id: bend.id,
      allowance: rounded(bend.allowance / per),
      deduction: rounded(bend.deduction / per),
      k: rounded(bend.k),
      insideRadius: rounded(bend.insideRadius / per),
      source: bend.allowanceSource,
      ...(bend.allowanceBasis ? { basis: scaledBasis(bend.allowanceBasis, 1 / per, rounded) } : {}),
    })),
  };
}
