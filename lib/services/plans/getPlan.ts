import { planDetail } from "./planDetail";
import { fail, ok, type Result } from "@/bending/core/result";
import { database } from "@/db/client";
import type { Failure } from "@/lib/api/failure";
import type { SignedInPerson } from "@/lib/auth/signedInPerson";
import type { PlanDetail } from "@/lib/schemas/views";

export async function getPlan(person: SignedInPerson, id: string): Promise<Result<PlanDetail, Failure>> {
  const plan = await planDetail(database(), person.role, id);
  return plan ? ok(plan) : fail({ kind: "not-found", message: "There is no such plan." });
}
