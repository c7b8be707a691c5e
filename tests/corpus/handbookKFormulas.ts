import { deg, mm, toRad } from "@/bending";
import { apexDeduction } from "@/bending/handbook/apexDeduction";
import { apexSetback } from "@/bending/handbook/apexSetback";
import { bendAllowance } from "@/bending/handbook/bendAllowance";
import { bendDeduction } from "@/bending/handbook/bendDeduction";
import { din6935CompensatingValue } from "@/bending/handbook/din6935CompensatingValue";
import { empiricalK, type empiricalKTable } from "@/bending/handbook/empiricalK";
import { faaAllowance } from "@/bending/handbook/faaAllowance";
import { genericK } from "@/bending/handbook/genericK";
import { grooverK } from "@/bending/handbook/grooverK";
import { insideSetback } from "@/bending/handbook/insideSetback";
import { kFromAllowance } from "@/bending/handbook/kFromAllowance";
import { outsideSetback } from "@/bending/handbook/outsideSetback";
import { squareCornerDeduction, type squareCorners } from "@/bending/handbook/squareCornerDeduction";
import { straightLength } from "@/bending/handbook/straightLength";
import type { CaseInput, CorpusFormulas } from "./handbookCase";

const length = (value: CaseInput[string] | undefined) => mm(Number(value));
const bendOf = (i: CaseInput) => [toRad(deg(Number(i.angle))), length(i.radius), length(i.thickness)] as const;
const faaDeduction = (i: CaseInput) => {
  const [angle, radius, thickness] = bendOf(i);
  return apexDeduction(angle, radius, thickness, faaAllowance(angle, radius, thickness));
};
const sum = (values: CaseInput[string] | undefined) => (values as readonly number[]).reduce((total, value) => total + value, 0);

export const handbookKFormulas: CorpusFormulas = {
  apexSetback: (i) => apexSetback(...bendOf(i)),
  /** FAA allowance, legs to the apex. */
  faaDeduction,
  /** Legs to the apex with equal bends between them, by the FAA allowance. */
  faaFlatLength: (i) => sum(i.legs) - ((i.legs as readonly number[]).length - 1) * faaDeduction(i),
  /** Straight lengths and one bend between each two of them. */
  straightsAndBends: (i) => {
    const [angle, radius, thickness] = bendOf(i);
    return sum(i.straights) + ((i.straights as readonly number[]).length - 1) * bendAllowance(angle, radius, Number(i.k), thickness);
  },
  /** What a leg keeps straight when one or two bends take their setback of it, inch. */
  faaStraight: (i) => Number(i.leg) - Number(i.ends) * apexSetback(...bendOf(i)),
  bendDeduction: (i) => {
    const [angle, radius, thickness] = bendOf(i);
    return bendDeduction(angle, radius, thickness, bendAllowance(angle, radius, Number(i.k), thickness));
  },
  squareCornerDeduction: (i) => squareCornerDeduction(Number(i.bends), length(i.thickness), i.corner as keyof typeof squareCorners),
  /** Outside sizes less what the corners between them take off. */
  squareCornerBlank: (i) => sum(i.legs) - squareCornerDeduction((i.legs as readonly number[]).length - 1, length(i.thickness), i.corner as keyof typeof squareCorners),
  /** Bends one after the other, and the straight parts of them all. */
  straightLengthTotal: (i) => {
    const radii = i.radii as readonly number[];
    const bends = (i.angles as readonly number[]).map((angle, bend) => straightLength(i.group as "soft" | "medium" | "hard", toRad(deg(angle)), length(radii[bend]), length(i.thickness)));
    return Number(i.straight) + sum(bends);
  },
  /** The K that a rule comes to where it has no radius term to blur it. */
  equivalentK: (i) => {
    const [right, none, thickness] = [toRad(deg(90)), mm(0), mm(1)];
    const allowance = i.rule === "faa" ? faaAllowance(right, none, thickness) : straightLength(i.rule as "soft" | "medium" | "hard", right, none, thickness);
    return kFromAllowance(allowance, right, none, thickness);
  },
  dinSignChange,
  /** Percent of the thickness that is gone in the bend, by where its inside and its outside are measured to. */
  thinningInBend: (i) => {
    const [angle, radius, thickness] = bendOf(i);
    return 100 * (1 - (outsideSetback(angle, radius, thickness) - insideSetback(angle, radius)) / thickness);
  },
  genericK: (i) => genericK(i.hardness as "soft" | "medium" | "hard", length(i.radius), length(i.thickness)),
  grooverK: (i) => grooverK(length(i.radius), length(i.thickness)),
  empiricalK: (i) => empiricalK(i.material as keyof typeof empiricalKTable, mm(Number(i.radius) * 25.4), mm(Number(i.thickness) * 25.4)) ?? NaN,
};

/** Opening angle in degrees at which the compensating value of ever larger radii turns from longer to shorter. */
function dinSignChange(): number {
  const perRadius = (opening: number) => (din6935CompensatingValue(toRad(deg(opening)), mm(2e6), mm(1)) - din6935CompensatingValue(toRad(deg(opening)), mm(1e6), mm(1))) / 1e6;
  let [low, high] = [30, 90];
  for (let halving = 0; halving < 40; halving += 1) {
    const middle = (low + high) / 2;
    if (perRadius(middle) < 0) low = middle;
    else high = middle;
  }
  return low;
}
