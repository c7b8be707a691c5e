import type { Metadata } from "next";
import { PlanScreen } from "@/components/plans/PlanScreen";
import { can } from "@/lib/auth/permissions";
import { requirePage } from "@/lib/auth/requirePage";

export const metadata: Metadata = { title: "Plan" };

export default async function PlanPage({ params }: { readonly params: Promise<{ id: string }> }) {
  const person = await requirePage("/plans/[id]");
  return <PlanScreen id={(await params).id} mayWrite={can(person.role, "plans:write")} />;
}
