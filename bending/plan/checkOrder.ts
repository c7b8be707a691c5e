import { buildPart } from "../part/buildPart";
import { emptyPlan } from "./emptyPlan";
import type { PlanDocument } from "./planDocument";
import type { CheckRequest } from "./planRequest";
import { readOrder } from "./readOrder";
import { solvePlan } from "./solvePlan";

/** The best plan that follows a person's own order (fronts, tools and stations are chosen), or the first step that fails and why. */
export function checkOrder(request: CheckRequest): PlanDocument {
  const started = request.now?.() ?? 0;
  const { document, materials, machine, batch } = request;
  const built = buildPart(document, { materials });
  const order = built.ok ? readOrder(built.value, request.order) : null;
  if (order && !order.ok) {
    return emptyPlan({
      part: document.name, machine: machine.name, units: document.units, batch, status: "infeasible", method: "decided before any search",
      reasons: order.error.map(({ message }) => ({ kind: "order", bends: [], faces: [], tools: [], message })),
    });
  }
  const plan = solvePlan(request, order?.value);
  return { ...plan, elapsedMs: (request.now?.() ?? 0) - started };
}
