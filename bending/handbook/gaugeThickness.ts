import { MM_PER_INCH, mm, type Mm } from "../core/units";
import { usStandardGauge } from "./usStandardGauge";

/** Whose gauge numbers are meant: the same number is another thickness in each. */
export type GaugeSystem = "steel" | "stainless" | "aluminium";

/** Decimals of an inch that the published tables of steel and aluminium print. */
const PRINTED_DECIMALS = 4;

/**
 * Nominal thickness of a US sheet gauge, 7 to 30, as its standard publishes it: stainless by the US Standard Gauge, whose law
 * (15 U.S.C. 206) prints fractions, so 22 ga is 1/32 in; steel by the manufacturers' standard gauge, US Standard x 40 / 41.82,
 * and aluminium by the wire gauge, 0.005 in x 92^((36 - g) / 39) (ASTM B258), whose tables print four decimals, so 22 ga is
 * 0.0299 and 0.0253 in. Charts that print 0.0312 for stainless have cut the fraction. Null outside the table. A gauge is nominal:
 * measure the sheet (ASTM A480 discourages gauge numbers). Standards named from memory; the values were seen in charts.
 */
export function gaugeThickness(gauge: number, system: GaugeSystem): Mm | null {
  const fraction = usStandardGauge[gauge];
  if (fraction === undefined) return null;
  const inches = system === "steel" ? printed((fraction * 40) / 41.82) : system === "stainless" ? fraction : printed(0.005 * 92 ** ((36 - gauge) / 39));
  return mm(inches * MM_PER_INCH);
}

const printed = (inches: number): number => Number(inches.toFixed(PRINTED_DECIMALS));
