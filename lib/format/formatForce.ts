import { formatNumber } from "./formatNumber";

/** Kilonewtons: one decimal under 100, whole above. */
export const formatForce = (kiloNewton: number): string => `${formatNumber(kiloNewton, Math.abs(kiloNewton) < 100 ? 1 : 0)} kN`;
