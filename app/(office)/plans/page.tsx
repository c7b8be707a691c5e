import type { Metadata } from "next";
import { PlanList } from "@/components/plans/PlanList";
import { can } from "@/lib/auth/permissions";
import { requirePage } from "@/lib/auth/requirePage";

export const metadata: Metadata = { title: "Plans" };

export default async function PlansPage() {
  const person = await requirePage("/plans");
  return <PlanList mayWrite={can(person.role, "plans:write")} />;
}
