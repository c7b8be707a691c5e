import type { Metadata } from "next";
import { PlanList } from "@/components/plans/PlanList";
import { requirePage } from "@/lib/auth/requirePage";

export const metadata: Metadata = { title: "Plans" };

export default async function PlansPage() {
  await requirePage("/plans");
  return <PlanList />;
}
