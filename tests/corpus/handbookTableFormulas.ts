import { deg, kgPerCubicMetre, mm } from "@/bending";
import { aluminiumMinimumRadius, type AluminiumTemper } from "@/bending/handbook/aluminiumMinimumRadius";
import { coldProfileTolerance } from "@/bending/handbook/coldProfileTolerance";
import { en485MinimumRadius } from "@/bending/handbook/en485MinimumRadius";
import { gaugeForThickness } from "@/bending/handbook/gaugeForThickness";
import type { GaugeSystem } from "@/bending/handbook/gaugeThickness";
import type { ToleranceClass } from "@/bending/handbook/generalTolerance";
import { generalAngleTolerance } from "@/bending/handbook/generalAngleTolerance";
import { generalLengthTolerance } from "@/bending/handbook/generalLengthTolerance";
import { liftingLimit } from "@/bending/handbook/liftingLimit";
import { lowCarbonMinimumRadius } from "@/bending/handbook/lowCarbonMinimumRadius";
import { onePersonArea } from "@/bending/handbook/onePersonArea";
import { radiusByReduction } from "@/bending/handbook/radiusByReduction";
import { sheetMass } from "@/bending/handbook/sheetMass";
import { softHardRadius, type softHardRadii } from "@/bending/handbook/softHardRadius";
import type { CaseInput, CorpusFormulas } from "./handbookCase";

const length = (value: CaseInput[string] | undefined) => mm(Number(value));

export const handbookTableFormulas: CorpusFormulas = {
  gaugeForThickness: (i) => gaugeForThickness(mm(Number(i.inches) * 25.4), i.system as GaugeSystem)?.gauge ?? NaN,
  /** Over the thickness; thickness in inches. */
  aluminiumMinimumRadius: (i) => aluminiumMinimumRadius(i.temper as AluminiumTemper, mm(Number(i.inches) * 25.4))?.timesThickness ?? NaN,
  en485MinimumRadius: (i) => (en485MinimumRadius(length(i.thickness)) ?? NaN) / Number(i.thickness),
  lowCarbonMinimumRadius: (i) => lowCarbonMinimumRadius(length(i.thickness)),
  radiusByReduction: (i) => radiusByReduction(Number(i.percent), length(i.thickness)),
  softHardRadius: (i) => softHardRadius(i.family as keyof typeof softHardRadii, i.condition as "soft" | "hard", mm(1)),
  sheetMass: (i) => sheetMass(length(i.width), length(i.depth), length(i.thickness), kgPerCubicMetre(Number(i.density))),
  onePersonArea: (i) => onePersonArea(length(i.thickness), kgPerCubicMetre(Number(i.density))),
  liftingLimit: (i) => liftingLimit({ horizontal: length(i.horizontal), height: length(i.height), travel: length(i.travel), asymmetry: deg(Number(i.asymmetry)) }).limit,
  generalLengthTolerance: (i) => generalLengthTolerance(i.class as ToleranceClass, length(i.size))?.deviation ?? NaN,
  generalAngleTolerance: (i) => (generalAngleTolerance(i.class as ToleranceClass, length(i.side))?.deviation ?? NaN) * 60,
  coldProfileTolerance: (i) => coldProfileTolerance(i.kind as "bend-to-bend" | "bend-to-edge", length(i.size), length(i.wall)) ?? NaN,
};
