import { buildPart, deg, flatPattern, materialById, mm, mpa, toRad, type PartDocument } from "@/bending";
import { airBendForces } from "@/bending/handbook/airBendForces";
import { bendAllowance } from "@/bending/handbook/bendAllowance";
import { din6935CompensatingValue } from "@/bending/handbook/din6935CompensatingValue";
import { din6935Factor } from "@/bending/handbook/din6935Factor";
import { faaAllowance } from "@/bending/handbook/faaAllowance";
import { gaugeThickness, type GaugeSystem } from "@/bending/handbook/gaugeThickness";
import { kFactorFromDeduction } from "@/bending/handbook/kFactorFromDeduction";
import { advisedFlange, minimumFlange } from "@/bending/handbook/minimumFlange";
import { minimumRadius } from "@/bending/handbook/minimumRadius";
import { steelRadiusTable } from "@/bending/handbook/steelRadiusTable";
import { naturalRadius } from "@/bending/handbook/naturalRadius";
import { outsideSetback } from "@/bending/handbook/outsideSetback";
import { penetrationDepth } from "@/bending/handbook/penetrationDepth";
import { springbackRatio } from "@/bending/handbook/springbackRatio";
import { straightLength } from "@/bending/handbook/straightLength";
import { vOpeningRule } from "@/bending/handbook/vOpeningRule";
import { materialToCsv } from "@/lib/schemas/materialToCsv";
import type { CaseInput, CorpusFormulas } from "./handbookCase";
import { handbookDieFormulas } from "./handbookDieFormulas";
import { handbookForceFormulas } from "./handbookForceFormulas";
import { handbookKFormulas } from "./handbookKFormulas";
import { handbookShopFormulas } from "./handbookShopFormulas";
import { handbookTableFormulas } from "./handbookTableFormulas";

export const handbookFormulas: CorpusFormulas = {
  ...handbookDieFormulas,
  ...handbookForceFormulas,
  ...handbookKFormulas,
  ...handbookShopFormulas,
  ...handbookTableFormulas,
  din6935Factor: (i) => din6935Factor(length(i.radius), length(i.thickness)),
  din6935CompensatingValue: (i) => din6935CompensatingValue(angle(i.opening), length(i.radius), length(i.thickness)),
  dinFlatLength,
  kFactorFromDeduction: (i) => kFactorFromDeduction(length(i.deduction), angle(90), length(i.radius), length(i.thickness)),
  bendAllowance: (i) => bendAllowance(angle(i.angle), length(i.radius), Number(i.k), length(i.thickness)),
  straightLength: (i) => straightLength(i.group as "soft" | "medium" | "hard", angle(i.angle), length(i.radius), length(i.thickness)),
  faaAllowance: (i) => faaAllowance(angle(i.angle), length(i.radius), length(i.thickness)),
  setbackFactor: (i) => outsideSetback(angle(i.angle), mm(0.75), mm(0.25)),
  airBendForce: (i) => {
    const forms = airBendForces(mpa(Number(i.tensile)), length(i.thickness), length(i.vOpening)).forms;
    return forms.find(({ source, formula }) => source.startsWith(String(i.form)) || formula.startsWith(String(i.form)))?.perMetre ?? NaN;
  },
  penetrationDepth: (i) => penetrationDepth(angle(180 - Number(i.included)), length(i.radius), length(i.thickness), dieOf(i)),
  minimumFlange: (i) => minimumFlange(angle(180 - Number(i.included)), dieOf(i)),
  dieChart: (i) => (i.what === "flange" ? advisedFlange(length(i.vOpening)) : naturalRadius(material("S235"), length(i.vOpening))),
  vOpeningRule: (i) => vOpeningRule(length(i.thickness)),
  springbackRatio: (i) => {
    const ratio = springbackRatio(length(i.radius), length(i.thickness), { yield: mpa(Number(i.yield)), modulus: mpa(Number(i.modulus)) });
    return ratio?.[i.result as "radiusRatio" | "finalRadius" | "angleRatio"] ?? NaN;
  },
  minimumRadius: (i) => {
    const steel = { ...material("S235"), minimumRadii: steelRadiusTable(mpa(Number(i.tensile))) };
    return minimumRadius(steel, length(i.thickness), angle(i.angle), i.alongGrain === true)?.radius ?? NaN;
  },
  materialMinimumRadius: (i) => minimumRadius(material(String(i.material)), length(i.thickness), angle(90))?.radius ?? NaN,
  materialValue: (i) => materialToCsv(material(String(i.material)))[i.value as "tensileLow" | "tensileHigh" | "yield" | "modulus" | "density"],
  gaugeThickness: (i) => (gaugeThickness(Number(i.gauge), i.system as GaugeSystem) ?? NaN) / 25.4,
};

const length = (value: CaseInput[string] | undefined) => mm(Number(value));
const angle = (value: CaseInput[string] | undefined) => toRad(deg(Number(value)));
const dieOf = (i: CaseInput) => ({ vOpening: length(i.vOpening), shoulderRadius: length(i.shoulderRadius) });

function material(id: string) {
  const found = materialById(id);
  if (!found) throw new Error(`no material ${id}`);
  return found;
}

/** The whole way from a document: legs of one profile with equal bends. */
function dinFlatLength(i: CaseInput): number {
  const legs = i.legs as readonly number[];
  const document: PartDocument = {
    format: "part/1", name: "corpus", units: "mm", material: "S235", thickness: Number(i.thickness), insideRadius: Number(i.radius), rule: "din6935",
    profile: { width: 100, legs, bends: legs.slice(1).map(() => ({ angle: Number(i.angle), direction: "up" as const })) },
  };
  const part = buildPart(document, { materials: materialById });
  return part.ok ? flatPattern(part.value).width : NaN;
}
