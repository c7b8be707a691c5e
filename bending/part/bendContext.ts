import type { Mm } from "../core/units";
import type { AllowanceBasis } from "../handbook/allowanceBasis";
import type { ShopTable } from "../shopTable/shopCell";

/** What is known of a part's bends beside its document. */
export interface BendContext {
  /** The inside radius that the chosen die gives a bend; used where the document gives none. */
  readonly radiusOf?: RadiusOf | undefined;
  /** The shop's own measured values; absent: the handbook alone speaks. */
  readonly shopTable?: ShopTable | undefined;
  /** The V of the die that forms a bend, for the shop's value; null or absent: the V that its inside radius stands for, else the usual one. */
  readonly openingOf?: ((bendId: string) => Mm | null) | undefined;
  /** Allowances decided before, as a stored plan has them: they are taken over, not asked anew. */
  readonly decidedOf?: ((bendId: string) => DecidedAllowance | null) | undefined;
}

export type RadiusOf = (bendId: string) => { readonly radius: Mm; readonly source: string } | null;

export interface DecidedAllowance {
  readonly allowance: Mm;
  readonly source: string;
  readonly basis: AllowanceBasis | null;
}
