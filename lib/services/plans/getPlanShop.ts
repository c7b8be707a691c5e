import { inputsDigest } from "./inputsDigest";
import { noSuchPlan } from "./noSuchPlan";
import { planInputs } from "./planInputs";
import { questionOf } from "./questionOf";
import { ok, type Result } from "@/bending/core/result";
import { PLAN_ENGINE } from "@/bending/plan/emptyPlan";
import { database } from "@/db/client";
import { findPlan } from "@/db/plans/findPlan";
import type { Failure } from "@/lib/api/failure";
import type { PlanShopView } from "@/lib/schemas/views";

/** What the question of a plan stands on today, for the browser to try orders with. */
export async function getPlanShop(planId: string): Promise<Result<PlanShopView, Failure>> {
  const db = database();
  const row = await findPlan(db, planId);
  if (!row) return noSuchPlan();
  const inputs = await planInputs(db, questionOf(row));
  if (!inputs.ok) return inputs;
  const planned = row.origin === "chosen" && row.from_plan_id !== null ? await findPlan(db, row.from_plan_id) : row;
  return ok({ task: inputs.value.task, asPlanned: inputsDigest(PLAN_ENGINE, inputs.value.task) === planned?.inputs_digest });
}
