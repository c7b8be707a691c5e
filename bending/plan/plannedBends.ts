import { mm, mmPer } from "../core/units";
import type { AllowanceBasis } from "../handbook/allowanceBasis";
import { scaledBasis } from "../handbook/scaledBasis";
import type { BendContext } from "../part/bendContext";
import type { PlanDocument } from "./planDocument";

/** Radii and allowances as a plan has them, to build its part again: whatever handbook and shop say now, the plan's flat stays. */
export function plannedBends({ flat, units }: Pick<PlanDocument, "flat" | "units">): Pick<BendContext, "radiusOf" | "decidedOf"> {
  const per = mmPer(units);
  const bends = new Map(flat.bends.map((bend) => [bend.id, bend]));
  return {
    radiusOf: (id) => {
      const bend = bends.get(id);
      return bend ? { radius: mm(bend.insideRadius * per), source: "plan" } : null;
    },
    decidedOf: (id) => {
      const bend = bends.get(id);
      if (!bend) return null;
      return { allowance: mm(bend.allowance * per), source: bend.source, basis: bend.basis ? (scaledBasis(bend.basis, per) as AllowanceBasis) : null };
    },
  };
}
