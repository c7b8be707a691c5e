import type { LengthUnit } from "../core/units";
import type { PlanDocument, PlanReason } from "./planDocument";

/** Names the planner's version; it is stored with each plan. */
export const PLAN_ENGINE = "foldwright-planner/2";

/** A plan without steps: the ground that answers are written on, and the answer when there is none. */
export function emptyPlan(of: {
  readonly part: string;
  readonly machine: string;
  readonly units: LengthUnit;
  readonly batch: number;
  readonly status: "infeasible" | "unknown";
  readonly method: string;
  readonly reasons: readonly PlanReason[];
}): PlanDocument {
  return {
    format: "plan/1",
    engine: PLAN_ENGINE,
    units: of.units,
    part: of.part,
    machine: of.machine,
    batch: of.batch,
    status: of.status,
    gap: 0,
    flat: { width: 0, depth: 0, area: 0, massKg: 0, bends: [] },
    flatLength: 0,
    steps: [],
    order: [],
    stations: [],
    seconds: { setup: 0, perPart: 0, total: 0 },
    cost: 0,
    proof: { method: of.method, expanded: 0, bound: 0 },
    reasons: of.reasons,
    cautions: [],
    elapsedMs: 0,
  };
}
