import { vOpeningRule } from "../handbook/vOpeningRule";
import type { BendNeed } from "./bendNeed";
import { dieMisfits } from "./dieMisfits";
import { fitsMachine } from "./fitsMachine";
import type { Machine } from "./machine";
import type { Die, Tool } from "./tool";

/** The dies that the machine holds and that can make the bend, nearest to the usual V opening for the thickness first. */
export function candidateDies(tools: readonly Tool[], machine: Machine, need: BendNeed): readonly Die[] {
  const usual = vOpeningRule(need.thickness);
  return tools
    .filter((tool): tool is Die => tool.kind === "die" && fitsMachine(tool, machine) === null && dieMisfits(tool, need).length === 0)
    .sort((a, b) => Math.abs(Math.log(a.vOpening / usual)) - Math.abs(Math.log(b.vOpening / usual)));
}
