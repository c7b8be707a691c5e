import type { Bend } from "../part/partModel";
import type { PlanReason } from "./planDocument";

/** A hem takes an acute bend and then a flattening stroke (two hits, common practice): no tool of the library flattens. */
export function hemReason(bend: Bend): PlanReason | null {
  if (bend.hem === null) return null;
  return {
    kind: "hem", bends: [bend.id], faces: [], tools: [],
    message: `the ${bend.hem} hem ${bend.id} needs an acute bend of about 28 to 30° included and then a flattening tool; the tools here are punches and dies for air bending only. ` +
      "Plan the part without the hem, or hem it elsewhere",
  };
}
