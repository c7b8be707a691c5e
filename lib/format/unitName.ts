import type { LengthUnit } from "@/bending/core/units";

/** The unit within a sentence: "lengths in inches". */
export const unitName = (unit: LengthUnit): string => (unit === "in" ? "inches" : "mm");
