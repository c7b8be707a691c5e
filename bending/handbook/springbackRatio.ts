import type { Mm } from "../core/units";
import type { MaterialFacts } from "./material";

export interface SpringbackRatio {
  /** Ri / Rf, radius under load over radius after. */
  readonly radiusRatio: number;
  readonly finalRadius: Mm;
  /** Ks = (2 Ri / t + 1) / (2 Rf / t + 1): angle after over angle under load; the German tables' kR. */
  readonly angleRatio: number;
}

/**
 * What is left of a bend that has the inside radius `radius` under load: Ri / Rf = 4 x³ - 3 x + 1 with
 * x = Ri Y / (E t) (Gardiner, Trans. ASME 79, 1957; Kalpakjian). Null when the sheet would spring back flat
 * (x over 0.5: the bend stays elastic).
 */
export function springbackRatio(radius: Mm, thickness: Mm, { yield: yieldStrength, modulus }: Pick<MaterialFacts, "yield" | "modulus">): SpringbackRatio | null {
  const x = (radius * yieldStrength) / (modulus * thickness);
  if (x >= 0.5) return null;
  const radiusRatio = 4 * x ** 3 - 3 * x + 1;
  const finalRadius = (radius / radiusRatio) as Mm;
  return { radiusRatio, finalRadius, angleRatio: ((2 * radius) / thickness + 1) / ((2 * finalRadius) / thickness + 1) };
}
