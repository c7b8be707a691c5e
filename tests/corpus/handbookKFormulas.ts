import { deg, mm, toRad } from "@/bending";
import { apexDeduction } from "@/bending/handbook/apexDeduction";
import { apexSetback } from "@/bending/handbook/apexSetback";
import { bendAllowance } from "@/bending/handbook/bendAllowance";
import { empiricalK, type empiricalKTable } from "@/bending/handbook/empiricalK";
import { faaAllowance } from "@/bending/handbook/faaAllowance";
import { genericK } from "@/bending/handbook/genericK";
import { grooverK } from "@/bending/handbook/grooverK";
import { squareCornerDeduction, type squareCorners } from "@/bending/handbook/squareCornerDeduction";
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
  squareCornerDeduction: (i) => squareCornerDeduction(Number(i.bends), length(i.thickness), i.corner as keyof typeof squareCorners),
  genericK: (i) => genericK(i.hardness as "soft" | "medium" | "hard", length(i.radius), length(i.thickness)),
  grooverK: (i) => grooverK(length(i.radius), length(i.thickness)),
  empiricalK: (i) => empiricalK(i.material as keyof typeof empiricalKTable, mm(Number(i.radius) * 25.4), mm(Number(i.thickness) * 25.4)) ?? NaN,
};
