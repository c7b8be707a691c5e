import type { CheckRequest } from "./planRequest";
import type { PlanDocument } from "./planDocument";
import { planPart } from "./planPart";

/** The plan that follows a person's own order, or the first step of it that fails and why. */
export function checkOrder(request: CheckRequest): PlanDocument {
  return planPart(request);
}
