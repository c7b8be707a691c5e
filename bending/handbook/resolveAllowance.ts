import { mm, type Mm, type Rad } from "../core/units";
import { bendAllowance } from "./bendAllowance";
import { bendDeduction } from "./bendDeduction";
import { din6935CompensatingValue } from "./din6935CompensatingValue";
import { faaAllowance } from "./faaAllowance";
import { kFromAllowance } from "./kFromAllowance";
import type { MaterialFacts } from "./material";
import { outsideSetback } from "./outsideSetback";
import { straightLength } from "./straightLength";

export type AllowanceRuleName = "shop" | "din6935" | "machinery" | "faa" | "k";

export interface AllowanceQuestion {
  /** The document's rule; undefined: the material's rule. */
  readonly rule?: AllowanceRuleName | undefined;
  /** K entered by hand for this bend or part; it goes before every rule. */
  readonly kOverride?: number | undefined;
  readonly material: MaterialFacts;
  readonly thickness: Mm;
  readonly insideRadius: Mm;
  /** Angle turned through, over 0. */
  readonly angle: Rad;
  readonly closedHem?: boolean;
}

export interface ResolvedAllowance {
  readonly allowance: Mm;
  readonly deduction: Mm;
  readonly k: number;
  /** Names the rule, e.g. "DIN 6935". */
  readonly source: string;
}

/**
 * The one place where a bend's allowance is decided: a K entered by hand, else the closed-hem practice, else
 * the rule. The three numbers always agree: allowance = angle (r + k t), deduction = 2 x setback - allowance.
 */
export function resolveAllowance(question: AllowanceQuestion): ResolvedAllowance {
  const { kOverride, material, thickness, insideRadius, angle } = question;
  const { allowance, source } = kOverride !== undefined
    ? { allowance: bendAllowance(angle, insideRadius, kOverride, thickness), source: "K entered by hand" }
    : question.closedHem
      ? { allowance: bendAllowance(angle, insideRadius, 0.5, thickness), source: CLOSED_HEM }
      : byRule(question.rule ?? materialRule(material), question);
  return {
    allowance,
    deduction: bendDeduction(angle, insideRadius, thickness, allowance),
    k: kFromAllowance(allowance, angle, insideRadius, thickness),
    source,
  };
}

/** K = 0.5 with no inside radius gives a deduction of 0.43 thickness, which is shop practice (from memory). */
const CLOSED_HEM = "closed hem, deduction 0.43 of the thickness (common practice)";

/** Steel and stainless by DIN 6935, everything else by the straight-length formulas. */
function materialRule(material: MaterialFacts): "din6935" | "machinery" {
  return material.group === "steel" || material.group === "stainless" ? "din6935" : "machinery";
}

function byRule(rule: AllowanceRuleName, q: AllowanceQuestion): { allowance: Mm; source: string } {
  const { material, thickness, insideRadius, angle } = q;
  switch (rule) {
    case "din6935": {
      const v = din6935CompensatingValue((Math.PI - angle) as Rad, insideRadius, thickness);
      return { allowance: mm(2 * outsideSetback(angle, insideRadius, thickness) - v), source: "DIN 6935" };
    }
    case "machinery":
      return {
        allowance: straightLength(material.straightLengthGroup, angle, insideRadius, thickness),
        source: `Machinery's Handbook, straight length, ${material.straightLengthGroup} group`,
      };
    case "faa":
      return { allowance: faaAllowance(angle, insideRadius, thickness), source: "FAA-H-8083-31" };
    case "shop":
    case "k": {
      const fallback = byRule(materialRule(material), q);
      const why = rule === "shop" ? "no shop value for this bend" : "no K-factor given";
      return { allowance: fallback.allowance, source: `${fallback.source} (${why})` };
    }
    default:
      return rule satisfies never;
  }
}
