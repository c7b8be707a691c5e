import { SAME_POINT_MM } from "../core/tolerance";
import { mm, rad } from "../core/units";
import { FORCE_V_RANGE } from "../handbook/airBendForce";
import { minimumFlange } from "../handbook/minimumFlange";
import { vOpeningRule } from "../handbook/vOpeningRule";
import type { BendNeed } from "./bendNeed";
import type { Die } from "./tool";
import type { ToolMisfit } from "./toolMisfit";

/**
 * What keeps a die from making a bend by air bending: the V within 5 to 20 thicknesses (where the force formula holds), its
 * natural radius near the one asked for, its angle at most the included angle under load, the flange still on the shoulder.
 */
export function dieMisfits(die: Die, need: BendNeed): readonly ToolMisfit[] {
  const included = rad(Math.PI - need.demandedAngle);
  const [from, to] = [mm(FORCE_V_RANGE[0] * need.thickness), mm(FORCE_V_RANGE[1] * need.thickness)];
  const gives = mm(need.naturalRadiusRatio * die.vOpening);
  const misfits: ToolMisfit[] = [];
  if (die.vOpening < from - SAME_POINT_MM || die.vOpening > to + SAME_POINT_MM) {
    misfits.push({ kind: "v-opening", tool: die.id, has: die.vOpening, from, to, usual: vOpeningRule(need.thickness) });
  }
  if (need.radiusAllowance !== null && Math.abs(gives - need.insideRadius) > need.radiusAllowance + SAME_POINT_MM) {
    misfits.push({ kind: "radius", tool: die.id, gives, wanted: need.insideRadius, allowance: need.radiusAllowance });
  }
  if (die.vAngle > included + 1e-9) misfits.push({ kind: "die-angle", tool: die.id, has: die.vAngle, most: included });
  if (need.shortestFlange !== null) {
    const least = minimumFlange(need.demandedAngle, die);
    if (need.shortestFlange < least - SAME_POINT_MM) misfits.push({ kind: "flange", tool: die.id, has: need.shortestFlange, least });
  }
  return misfits;
}
