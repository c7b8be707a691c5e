import { SAME_POINT_MM } from "../core/tolerance";
import { rad } from "../core/units";
import type { BendNeed } from "./bendNeed";
import type { Punch } from "./tool";
import type { ToolMisfit } from "./toolMisfit";

/** What keeps a punch from making a bend by air bending: tip angle at most the included angle under load, tip radius at most the inside radius. */
export function punchMisfits(punch: Punch, need: BendNeed): readonly ToolMisfit[] {
  const included = rad(Math.PI - need.demandedAngle);
  const misfits: ToolMisfit[] = [];
  if (punch.tipAngle > included + 1e-9) misfits.push({ kind: "punch-angle", tool: punch.id, has: punch.tipAngle, most: included });
  if (punch.tipRadius > need.insideRadius + SAME_POINT_MM) misfits.push({ kind: "tip-radius", tool: punch.id, has: punch.tipRadius, most: need.insideRadius });
  return misfits;
}
