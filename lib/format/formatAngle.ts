import { formatNumber } from "./formatNumber";

/** Degrees with the sign: `90°`, `22.5°`. */
export const formatAngle = (degrees: number, digits = 2): string => `${formatNumber(degrees, digits)}°`;
