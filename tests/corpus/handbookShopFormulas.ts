import { deg, mm, mpa, toDeg, toRad } from "@/bending";
import { bendToHemDistance } from "@/bending/handbook/bendToHemDistance";
import { hemDeduction } from "@/bending/handbook/hemDeduction";
import { hemSteps } from "@/bending/handbook/hemSteps";
import { holeOverDie } from "@/bending/handbook/holeOverDie";
import { holeToBend, type HoleDistance, type PiercedFeature } from "@/bending/handbook/holeToBend";
import { minimumCurlRadius } from "@/bending/handbook/minimumCurlRadius";
import { radiusByRule } from "@/bending/handbook/radiusByRule";
import { radiusBySteps, SMOOTH_STEP, type SteppedRadius } from "@/bending/handbook/radiusBySteps";
import { radiusRules } from "@/bending/handbook/radiusRules";
import { reliefSize, type ReliefSize } from "@/bending/handbook/reliefSize";
import { sharpBendLimit } from "@/bending/handbook/sharpBendLimit";
import { tensileScaledRadius } from "@/bending/handbook/tensileScaledRadius";
import { vOpeningChart, type VOpeningChart } from "@/bending/handbook/vOpeningChart";
import { vOpeningForMethod } from "@/bending/handbook/vOpeningForMethod";
import type { CaseInput, CorpusFormulas } from "./handbookCase";

const length = (value: CaseInput[string] | undefined) => mm(Number(value));
const inch = (value: CaseInput[string] | undefined) => mm(Number(value) * 25.4);
const end = (i: CaseInput) => (i.end === "highest" ? 1 : 0);

export const handbookShopFormulas: CorpusFormulas = {
  /** V over thickness. */
  vOpeningChart: (i) => {
    const thickness = i.chart === "inch" ? inch(i.thickness) : length(i.thickness);
    return vOpeningChart(thickness, i.chart as VOpeningChart).vOpening / thickness;
  },
  vOpeningForMethod: (i) => vOpeningForMethod(length(i.thickness), i.method as "coining" | "partial")[end(i)],
  radiusByRule: (i) => {
    const rule = radiusRules.find(({ id }) => id === i.rule);
    return rule ? radiusByRule(rule, length(i.vOpening))[end(i)] : NaN;
  },
  /** Strength in ksi, lengths in inches. */
  tensileScaledRadius: (i) => tensileScaledRadius(mpa(Number(i.ksi) * 6.894757), inch(i.vOpening)) / 25.4,
  sharpBendLimit: (i) => sharpBendLimit(length(i.thickness)),
  hemPreBend: (i) => hemSteps(length(i.thickness)).preBendOpening[end(i)],
  hemHits: (i) => hemSteps(length(i.thickness)).hits,
  /** 1 when a two-stage die suits the thickness, 0 when not. */
  hemSuitsTwoStageDie: (i) => Number(hemSteps(length(i.thickness)).suitsTwoStageDie),
  hemReturnLength: (i) => hemSteps(length(i.thickness)).returnLength,
  hemDeduction: (i) => hemDeduction(length(i.thickness), length(i.gap), Number(i.k)),
  bendToHemDistance: (i) => bendToHemDistance(length(i.thickness), length(i.bendRadius), length(i.hemRadius)),
  radiusBySteps: (i) => {
    const wish = i.insidePitch === undefined ? { angle: toRad(deg(Number(i.step))) } : { insidePitch: length(i.insidePitch) };
    return radiusBySteps(toRad(deg(Number(i.angle))), length(i.radius), length(i.thickness), Number(i.k), wish)[i.result as keyof SteppedRadius];
  },
  /** Degrees a hit. */
  smoothStep: () => toDeg(SMOOTH_STEP),
  /** 1 over the V, 0 beside it. */
  holeOverDie: (i) => Number(holeOverDie(length(i.edgeToBendLine), length(i.vOpening))),
  holeToBend: (i) => {
    const feature = (i.kind === "slot" ? { kind: "slot", length: inch(i.slotLength) } : { kind: i.kind }) as PiercedFeature;
    return holeToBend(feature, length(i.thickness), length(i.radius))[i.result as Exclude<keyof HoleDistance, "source">];
  },
  reliefSize: (i) => reliefSize(length(i.thickness), length(i.radius))[i.result as keyof ReliefSize][end(i)],
  minimumCurlRadius: (i) => minimumCurlRadius(length(i.thickness)),
};
