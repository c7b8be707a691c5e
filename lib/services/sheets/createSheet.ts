import { foundAgain } from "../foundAgain";
import { recordEvent } from "../recordEvent";
import { sheetDetail } from "./sheetDetail";
import { fail, ok, type Result } from "@/bending/core/result";
import { database } from "@/db/client";
import { findPlan, type PlanRow } from "@/db/plans/findPlan";
import { insertSheet } from "@/db/sheets/insertSheet";
import type { Failure } from "@/lib/api/failure";
import type { SignedInPerson } from "@/lib/auth/signedInPerson";
import type { SheetDetail } from "@/lib/schemas/views";

/** A draft of a plan's setup sheet; asked for twice, it is the same draft. Plans that cannot be made have none. */
export async function createSheet(person: SignedInPerson, planId: string): Promise<Result<SheetDetail, Failure>> {
  const db = database();
  const plan = await findPlan(db, planId);
  if (!plan) return fail({ kind: "not-found", message: "There is no such plan (any more)." });
  const refusal = refusalOf(plan);
  if (refusal !== null) return fail({ kind: "conflict", message: refusal });
  const id = await db.transaction(async (within) => {
    const sheet = await insertSheet(within, { planId, partId: plan.part_id, machineId: plan.machine_id, by: person.id });
    if (sheet.inserted) await recordEvent(within, person, "drafted a setup sheet", `${sheet.number} ${plan.part_number} rev ${plan.revision}`, `on ${plan.machine_name}`);
    return sheet.id;
  });
  return ok(foundAgain(await sheetDetail(db, person.role, id)));
}

function refusalOf({ status, plan }: PlanRow): string | null {
  if (status === "infeasible") return `This plan cannot be made, so it has no setup sheet. ${plan.reasons[0]?.message ?? ""}`.trim();
  if (status === "unknown") return "This plan is undecided, so it has no setup sheet. Plan the part again with more tools, another machine or a simpler part.";
  return plan.steps.length === 0 ? "This plan has no bends to make, so it has no setup sheet." : null;
}
