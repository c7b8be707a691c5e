import type { Machine } from "../tooling/machine";
import type { Die, Punch } from "../tooling/tool";
import { createFingerAgainstTools } from "./createFingerAgainstTools";

/** Does a gauge finger with its stop at (x, r) stand in the tools, the ram or the bed when the punch touches the flat sheet? */
export function fingerMeetsTools(x: number, r: number, thickness: number, punch: Punch, die: Die, machine: Machine): boolean {
  return createFingerAgainstTools(machine).pair(x, r, thickness, punch, die);
}
