import type { PlanDocument } from "./planDocument";
import type { PlanRequest } from "./planRequest";
import { solvePlan } from "./solvePlan";

/** Order, tools, stations and gauge of a part on a machine, with the proof or the reasons. */
export function planPart(request: PlanRequest): PlanDocument {
  const started = request.now?.() ?? 0;
  const plan = solvePlan(request);
  return { ...plan, elapsedMs: (request.now?.() ?? 0) - started };
}
