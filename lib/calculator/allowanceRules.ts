import { rad, mm, toRad, deg } from "@/bending/core/units";
import { din6935Factor } from "@/bending/handbook/din6935Factor";
import { DIN6935_NEGLECTED_ABOVE_DEGREES } from "@/bending/handbook/din6935CompensatingValue";
import { outsideSetback } from "@/bending/handbook/outsideSetback";
import { resolveAllowance, type AllowanceRuleName, type ResolvedAllowance } from "@/bending/handbook/resolveAllowance";
import { straightLength } from "@/bending/handbook/straightLength";
import type { Formula } from "./answer";
import { bendFigures } from "./bendFigures";
import { figures } from "./figures";
import type { Question } from "./question";

export type CalculatorRule = Exclude<AllowanceRuleName, "shop">;

export interface RuleAnswer extends ResolvedAllowance {
  readonly rule: CalculatorRule;
  readonly title: string;
  readonly formula: Formula;
}

const rules: readonly CalculatorRule[] = ["din6935", "machinery", "faa", "k"];
const titles: Readonly<Record<CalculatorRule, string>> = { din6935: "DIN 6935", machinery: "Straight length", faa: "FAA", k: "K by hand" };

/** The rule that the material goes by when a part names none. */
export const materialRule = ({ material }: Question): CalculatorRule => material.allowance.rule;

/** The K that the rule of that name goes by: the material's own where it is its rule and none was chosen. */
const kOf = ({ material: { allowance }, choices, number }: Question): number => (allowance.rule === "k" && choices.rule === "material" ? allowance.k : number("k"));

/** The bend by each rule, the chosen one first. */
export function allowanceRules(q: Question): readonly RuleAnswer[] {
  const chosen = q.choices.rule === "material" ? materialRule(q) : q.choices.rule;
  return [chosen, ...rules.filter((rule) => rule !== chosen)].map((rule) => {
    const { material, thickness, insideRadius, angle } = q;
    const resolved = resolveAllowance({ rule, material, thickness, insideRadius, angle, ...(rule === "k" ? { kOverride: kOf(q) } : {}) });
    return { ...resolved, rule, title: titles[rule], formula: formulaOf(rule, q) };
  });
}

function formulaOf(rule: CalculatorRule, q: Question): Formula {
  const { α, R, t } = bendFigures(q);
  switch (rule) {
    case "din6935":
      return 180 - q.degrees > DIN6935_NEGLECTED_ABOVE_DEGREES
        ? { text: "BA = 2 · SB", of: { SB: figures.length(outsideSetback(q.angle, q.insideRadius, q.thickness)) } }
        : { text: "BA = [π | 180°] · α · (R + [k | 2] · t)", of: { α, R, t, k: figures.ratio(din6935Factor(q.insideRadius, q.thickness)) } };
    case "machinery":
      return { text: "BA = (c · t + 1.57 · R) · [α | 90°]", of: { α, R, t, c: figures.ratio(straightLength(q.material.straightLengthGroup, rad(Math.PI / 2), mm(0), mm(1))) } };
    case "faa":
      return { text: "BA = (0.01743 · R + 0.0078 · t) · [α | 1°]", of: { α, R, t } };
    case "k":
      return { text: "BA = [π | 180°] · α · (R + K · t)", of: { α, R, t, K: figures.ratio(kOf(q)) } };
    default:
      return rule satisfies never;
  }
}

/** A radian in degrees, for K = (BA / α - R) / t. */
export const DEGREES_PER_RADIAN = 1 / toRad(deg(1));
