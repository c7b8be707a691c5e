import { mm, type Mm, type Rad } from "../core/units";
import { shopValue } from "../shopTable/shopValue";
import type { ShopTable } from "../shopTable/shopCell";
import type { AllowanceBasis, AllowanceSaid, OpeningSource } from "./allowanceBasis";
import { bendAllowance } from "./bendAllowance";
import { bendDeduction } from "./bendDeduction";
import { din6935CompensatingValue } from "./din6935CompensatingValue";
import { faaAllowance } from "./faaAllowance";
import { kFromAllowance } from "./kFromAllowance";
import type { MaterialAllowance, MaterialFacts } from "./material";
import { outsideSetback } from "./outsideSetback";
import { straightLength } from "./straightLength";

export type AllowanceRuleName = "shop" | "din6935" | "machinery" | "faa" | "k";

export interface AllowanceQuestion {
  /** The document's rule; undefined: the shop's value, else the material's rule. */
  readonly rule?: AllowanceRuleName | undefined;
  /** K entered by hand for this bend or part; it goes before every rule. */
  readonly kOverride?: number | undefined;
  readonly material: MaterialFacts;
  readonly thickness: Mm;
  readonly insideRadius: Mm;
  /** Angle turned through, over 0. */
  readonly angle: Rad;
  readonly closedHem?: boolean;
  /** The shop's table and the V that it is asked for; absent for a hem, which no V forms. */
  readonly shop?: { readonly table: ShopTable; readonly vOpening: Mm; readonly openingFrom: OpeningSource } | undefined;
}

export interface ResolvedAllowance {
  readonly allowance: Mm;
  readonly deduction: Mm;
  readonly k: number;
  /** Names what decided, e.g. "DIN 6935". */
  readonly source: string;
  /** The same as data, with the shop's trials and what the next source would have said. */
  readonly basis: AllowanceBasis;
}

/**
 * The one place where a bend's allowance is decided. Sources in order: a K entered by hand; the closed-hem practice; a handbook rule that
 * the document names; the shop's own measured value; the material's rule. The three numbers always agree: allowance = angle (r + k t),
 * deduction = 2 x setback - allowance. A shop value gives the deduction, which is what was measured: for another inside radius on
 * the same V it stays, and allowance and K follow.
 */
export function resolveAllowance(question: AllowanceQuestion): ResolvedAllowance {
  const [first, next] = answers(question);
  if (!first) throw new Error("invariant: the material's rule always says something");
  const { allowance, deduction, k, text } = first;
  return { allowance, deduction, k, source: text, basis: { ...first, next: next ?? null } };
}

/** What each source says that has something to say, in order. */
function answers(question: AllowanceQuestion): readonly AllowanceSaid[] {
  const { rule, kOverride, material, thickness, insideRadius, angle } = question;
  const named = rule === "din6935" || rule === "machinery" || rule === "faa" ? rule : null;
  const shop = rule === "k" ? undefined : byShop(question);
  const missing = rule === "shop" && !shop ? "no shop value for this bend" : rule === "k" && kOverride === undefined ? "no K-factor given" : undefined;
  return [
    ...(kOverride === undefined ? [] : [said(question, "override", "K entered by hand", bendAllowance(angle, insideRadius, kOverride, thickness))]),
    // K = 0.5 with no inside radius gives a deduction of 0.43 thickness, which is shop practice (from memory).
    ...(question.closedHem ? [said(question, "closed hem", CLOSED_HEM, bendAllowance(angle, insideRadius, 0.5, thickness))] : []),
    ...(named === null ? [] : [byHandbook(question, { rule: named })]),
    ...(shop ? [shop] : []),
    ...(named === material.allowance.rule ? [] : [byHandbook(question, material.allowance, missing)]),
  ];
}

const CLOSED_HEM = "closed hem, deduction 0.43 of the thickness (common practice)";

function said({ thickness, insideRadius, angle }: AllowanceQuestion, kind: AllowanceSaid["kind"], text: string, allowance: Mm): AllowanceSaid {
  return { kind, text, allowance, deduction: bendDeduction(angle, insideRadius, thickness, allowance), k: kFromAllowance(allowance, angle, insideRadius, thickness), shop: null };
}

function byShop(question: AllowanceQuestion): AllowanceSaid | undefined {
  const { shop, material, thickness, insideRadius, angle } = question;
  const value = shop && shopValue(shop.table, { material: material.id, thickness, vOpening: shop.vOpening, angle });
  if (!value) return undefined;
  const { count, spread, expanded, lastMeasured, vOpening, places, deduction, interpolated } = value;
  const trials = `${count} ${count === 1 ? "trial" : "trials"}`;
  const allowance = mm(2 * outsideSetback(angle, insideRadius, thickness) - deduction);
  const answer = said(question, interpolated ? "shop interpolated" : "shop", interpolated ? `between shop values, ${trials}` : `shop value of ${trials}`, allowance);
  // An inside radius so far from what this V bends that the neutral line would leave the sheet was not measured by these trials.
  if (answer.k < 0 || answer.k > 1) return undefined;
  return {
    ...answer,
    shop: { count, spread, expanded, lastMeasured, vOpening, places, openingFrom: shop.openingFrom },
  };
}

function byHandbook(question: AllowanceQuestion, by: MaterialAllowance, why?: string): AllowanceSaid {
  const { material, thickness, insideRadius, angle } = question;
  const inWords = (text: string) => (why === undefined ? text : `${text} (${why})`);
  switch (by.rule) {
    case "din6935": {
      const v = din6935CompensatingValue((Math.PI - angle) as Rad, insideRadius, thickness);
      return said(question, "handbook", inWords("DIN 6935"), mm(2 * outsideSetback(angle, insideRadius, thickness) - v));
    }
    case "machinery":
      return said(question, "handbook", inWords(`Machinery's Handbook, straight length, ${material.straightLengthGroup} group`), straightLength(material.straightLengthGroup, angle, insideRadius, thickness));
    case "faa":
      return said(question, "handbook", inWords("FAA-H-8083-31"), faaAllowance(angle, insideRadius, thickness));
    case "k":
      return said(question, "handbook", inWords(`K ${by.k} of ${material.id}`), bendAllowance(angle, insideRadius, by.k, thickness));
    default:
      return by satisfies never;
  }
}
