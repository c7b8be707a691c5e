import { emptyPlan } from "./emptyPlan";
import type { PlanDocument } from "./planDocument";
import type { PlanRequest } from "./planRequest";

/** Order, tools, stations and gauge of a part on a machine, with the proof or the reasons. */
export function planPart(request: PlanRequest): PlanDocument {
  const { document, machine, batch } = request;
  return emptyPlan({
    part: document.name, machine: machine.name, units: document.units, batch,
    status: "unknown", method: "nothing searched", reasons: [],
  });
}
