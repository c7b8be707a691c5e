import { MM_PER_INCH, mm, type Mm } from "../core/units";

export type GaugeSystem = "steel" | "stainless" | "aluminium";

/** US Standard Gauge: pounds a square foot over 40 gives inches of wrought iron; sixteenths down to 640ths. */
const US_STANDARD: Readonly<Record<number, number>> = {
  7: 3 / 16, 8: 11 / 64, 9: 5 / 32, 10: 9 / 64, 11: 1 / 8, 12: 7 / 64, 13: 3 / 32, 14: 5 / 64, 15: 9 / 128, 16: 1 / 16,
  17: 9 / 160, 18: 1 / 20, 19: 7 / 160, 20: 3 / 80, 21: 11 / 320, 22: 1 / 32, 23: 9 / 320, 24: 1 / 40, 25: 7 / 320,
  26: 3 / 160, 27: 11 / 640, 28: 1 / 64, 29: 9 / 640, 30: 1 / 80,
};

/**
 * Nominal thickness of a US sheet gauge, 7 to 30: steel (manufacturers' standard) = US Standard x 40 / 41.82,
 * stainless = the US Standard fraction, aluminium = 0.005 in x 92^((36 - g) / 39). Null outside the table.
 * A gauge is nominal; ASTM A480 discourages gauge numbers.
 */
export function gaugeThickness(gauge: number, system: GaugeSystem): Mm | null {
  const fraction = US_STANDARD[gauge];
  if (fraction === undefined) return null;
  const inches = system === "steel" ? (fraction * 40) / 41.82 : system === "stainless" ? fraction : 0.005 * 92 ** ((36 - gauge) / 39);
  return mm(inches * MM_PER_INCH);
}
