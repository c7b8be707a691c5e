import { formatNumber } from "./formatNumber";

/** Kilograms, in grams under 100 g. */
export const formatMass = (kilograms: number): string =>
  kilograms < 0.1 ? `${formatNumber(kilograms * 1000, 1)} g` : `${formatNumber(kilograms, kilograms < 10 ? 3 : 1)} kg`;
