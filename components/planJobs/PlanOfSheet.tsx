"use client";
import { usePlan } from "@/lib/queries/plans";
import { LastCheck } from "./LastCheck";

/** When the plan of a sheet was last looked over again, and what came of it; nothing when it never was. */
export function PlanOfSheet({ planId }: { readonly planId: string }) {
  const { data } = usePlan(planId);
  return data ? <LastCheck check={data.lastCheck} plan={data.plan} /> : null;
}
