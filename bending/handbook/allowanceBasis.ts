import type { Mm } from "../core/units";
import type { ShopValue } from "../shopTable/shopAnswer";

/** What a bend's allowance stands on, in the order in which a source is asked. */
export type AllowanceSourceKind = "override" | "closed hem" | "shop" | "shop interpolated" | "handbook";

/** How the V came about that a shop value was looked up for: of the die that forms the bend, of the inside radius asked for, or the usual one. */
export type OpeningSource = "die" | "radius" | "usual";

/** What one source says of a bend; lengths in mm. */
export interface AllowanceSaid {
  readonly kind: AllowanceSourceKind;
  /** Names the source in words, e.g. "DIN 6935" or "shop value of 5 trials". */
  readonly text: string;
  readonly allowance: Mm;
  readonly deduction: Mm;
  readonly k: number;
  /** The measured value, when the source is the shop. */
  readonly shop: ShopBasis | null;
}

export interface ShopBasis extends Pick<ShopValue, "count" | "spread" | "expanded" | "lastMeasured" | "vOpening" | "places"> {
  readonly openingFrom: OpeningSource;
}

/** The source that decided, and what the next one in order would have said; null when there is no other. */
export interface AllowanceBasis extends AllowanceSaid {
  readonly next: AllowanceSaid | null;
}
