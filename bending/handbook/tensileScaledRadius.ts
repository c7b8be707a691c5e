import { mm, type Mm, type MPa } from "../core/units";
import { MILD_STEEL_US } from "./forceForms";

/** Fitted to two published cases, so it has no source of its own. */
const AT_MILD_STEEL = 0.156;

/**
 * Natural inside radius in proportion to tensile strength: R = 0.156 (Rm / 60 ksi) V. The form is inferred from a trade
 * magazine's cases (The FABRICATOR) and the constant fitted to two of them; the magazine warns that measured radii differ.
 */
export function tensileScaledRadius(tensile: MPa, vOpening: Mm): Mm {
  return mm(AT_MILD_STEEL * (tensile / MILD_STEEL_US) * vOpening);
}
