import type { PlanTask } from "./planTask";
import type { CheckRequest, PlanRequest } from "@/bending/plan/planRequest";

/** The question of a task as the planner takes it; with a person's own order when the task has one. */
export function requestOf(task: PlanTask): PlanRequest | CheckRequest {
  const { material, document, tools, machine, batch, alternatives, shopTable, airForceFactor, order, wishes } = task;
  return {
    document, tools, machine, batch, alternatives,
    materials: (id) => (id === material.id ? material : undefined),
    ...(shopTable === undefined ? {} : { shopTable }),
    ...(airForceFactor === undefined ? {} : { airForceFactor }),
    ...(wishes === undefined ? {} : { wishes }),
    ...(order === undefined ? {} : { order }),
  };
}
