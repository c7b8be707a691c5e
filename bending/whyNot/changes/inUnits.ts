import { mmPer, type LengthUnit } from "../../core/units";
import type { PlanDocument } from "../../plan/planDocument";
import { rounded } from "../../plan/rounded";
import type { Change } from "../createAttempts";

interface Worked { readonly change: Change; readonly plan: PlanDocument; readonly notEnough?: number }

/** What was found about a length in mm, with its proof in the document's unit. */
export function inUnits({ change, plan, notEnough }: Worked, resolutionMm: number, units: LengthUnit): Worked & { readonly resolution: number } {
  const per = mmPer(units);
  return { change, plan, ...(notEnough === undefined ? {} : { notEnough: rounded(notEnough / per) }), resolution: rounded(resolutionMm / per) };
}
