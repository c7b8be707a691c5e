import type { Bend } from "../part/partModel";
import type { Tool } from "../tooling/tool";
import type { PlanReason } from "./planDocument";

/** A hem takes an acute stroke and then a flattening one (two hits, common practice): said where no die in service flattens. */
export function hemReason(bend: Bend, tools: readonly Tool[]): PlanReason | null {
  if (bend.hem === null || tools.some((tool) => tool.kind === "die" && tool.flattening !== undefined && tool.pieces.length > 0)) return null;
  return {
    kind: "hem", bends: [bend.id], faces: [], tools: [],
    message: `the ${bend.hem} hem ${bend.id} needs an acute bend of about 28 to 30° included and then a slot that flattens it; no two-stage hem die is in service. ` +
      "Plan the part without the hem, or hem it elsewhere",
  };
}
