import { mmPer } from "@/bending/core/units";
import { scaledBasis } from "@/bending/handbook/scaledBasis";
import type { PlanDocument } from "@/bending/plan/planDocument";
import { allowanceText } from "@/lib/format/allowanceText";
import { createSheetFormat } from "./createSheetFormat";
import type { SheetFlat } from "./sheetView";

/** The flat blank's numbers, each bend with where its allowance comes from. */
export function sheetFlat({ flat, units }: Pick<PlanDocument, "flat" | "units">): SheetFlat {
  const format = createSheetFormat(units);
  const per = mmPer(units);
  return {
    width: format.fine(flat.width * per),
    depth: format.fine(flat.depth * per),
    area: format.area(flat.area * per * per),
    mass: format.mass(flat.massKg),
    bends: flat.bends.map((bend) => ({
      id: bend.id,
      allowance: format.fine(bend.allowance * per),
      deduction: format.fine(bend.deduction * per),
      k: format.ratio(bend.k),
      insideRadius: format.fine(bend.insideRadius * per),
      source: bend.basis ? allowanceText(scaledBasis(bend.basis, per), units) : bend.source,
    })),
  };
}
