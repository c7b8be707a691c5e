import type { BendNeed } from "./bendNeed";
import { fitsMachine } from "./fitsMachine";
import type { Machine } from "./machine";
import { punchMisfits } from "./punchMisfits";
import type { Punch, Tool } from "./tool";

/** The punches that the machine holds and that can make the bend, in the order given. */
export function candidatePunches(tools: readonly Tool[], machine: Machine, need: BendNeed): readonly Punch[] {
  return tools.filter((tool): tool is Punch => tool.kind === "punch" && fitsMachine(tool, machine) === null && punchMisfits(tool, need).length === 0);
}
