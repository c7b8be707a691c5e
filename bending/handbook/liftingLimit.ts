import type { Deg, Mm } from "../core/units";

/** Load constant of the NIOSH lifting equation: 51 lb. */
export const LOAD_CONSTANT_KG = 23;

/** Upper guide values of the British HSE for one person, kg (second-hand). */
export const HSE_GUIDE_KG = { men: 25, women: 16 } as const;

export interface Lift {
  /** Hands in front of the middle between the ankles. */
  readonly horizontal: Mm;
  /** Hands over the floor at the start. */
  readonly height: Mm;
  /** How far up or down the load travels. */
  readonly travel: Mm;
  /** How far the body turns from straight ahead. */
  readonly asymmetry: Deg;
  /** Multiplier for how often and how long; 1 for now and then. */
  readonly frequency?: number;
  /** Multiplier for the grip; 1 for good handholds. */
  readonly coupling?: number;
}

export interface LiftingLimit {
  /** Recommended weight limit, kg; 0 where the equation forbids the lift. */
  readonly limit: number;
  readonly multipliers: Readonly<Record<"horizontal" | "vertical" | "distance" | "asymmetry" | "frequency" | "coupling", number>>;
}

/**
 * NIOSH lifting equation: RWL = 23 kg x (25 / H)(1 - 0.003 |V - 75|)(0.82 + 4.5 / D)(1 - 0.0032 A) FM CM, H, V and D in cm;
 * no multiplier over 1, and none left over 63 cm out, 175 cm up, 175 cm of travel or 135 degrees. Constant seen,
 * equation and bounds from memory. Advice only: local rules decide; OSHA sets no limit of its own.
 */
export function liftingLimit({ horizontal, height, travel, asymmetry, frequency = 1, coupling = 1 }: Lift): LiftingLimit {
  const [h, v, d] = [horizontal / 10, height / 10, travel / 10];
  const multipliers = {
    horizontal: h > 63 ? 0 : Math.min(1, 25 / h),
    vertical: v > 175 ? 0 : 1 - 0.003 * Math.abs(v - 75),
    distance: d > 175 ? 0 : Math.min(1, 0.82 + 4.5 / d),
    asymmetry: asymmetry > 135 ? 0 : 1 - 0.0032 * asymmetry,
    frequency,
    coupling,
  };
  return { limit: Object.values(multipliers).reduce((product, one) => product * one, LOAD_CONSTANT_KG), multipliers };
}
