import { airBendForce } from "../handbook/airBendForce";
import type { BendNeed } from "./bendNeed";
import { dieMisfits } from "./dieMisfits";
import { punchMisfits } from "./punchMisfits";
import type { Die, Punch } from "./tool";
import type { ToolMisfit } from "./toolMisfit";

/** Everything that keeps a punch and a die from making a bend together, the force against both makers' ratings included. */
export function pairMisfits(punch: Punch, die: Die, need: BendNeed): readonly ToolMisfit[] {
  const needs = airBendForce(need.tensile, need.thickness, die.vOpening);
  const overloaded = [punch, die].flatMap((tool): readonly ToolMisfit[] =>
    needs > tool.maxForcePerMetre ? [{ kind: "force", tool: tool.id, needs, rating: tool.maxForcePerMetre }] : []);
  return [...punchMisfits(punch, need), ...dieMisfits(die, need), ...overloaded];
}
