import { mm } from "@/bending/core/units";
import { generalAngleTolerance } from "@/bending/handbook/generalAngleTolerance";
import { generalLengthTolerance } from "@/bending/handbook/generalLengthTolerance";

export const GENERAL_TOLERANCE = "ISO 2768-1 m";

/**
 * The general tolerance (plus and minus) that holds when a drawing states none: for a length in mm, or for an angle in
 * degrees whose shorter side is `size` mm. Null where the table has no entry (under 0.5 mm or over 4 m).
 */
export function generalTolerance(kind: "length" | "angle", size: number): number | null {
  return (kind === "length" ? generalLengthTolerance : generalAngleTolerance)("m", mm(size))?.deviation ?? null;
}
