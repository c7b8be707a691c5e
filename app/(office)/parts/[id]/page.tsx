import { Suspense } from "react";
import { PartPage } from "@/components/parts/part/PartPage";
import { can } from "@/lib/auth/permissions";
import { requirePage } from "@/lib/auth/requirePage";

export const metadata = { title: "Part" };

export default async function PartRoute({ params }: { readonly params: Promise<{ readonly id: string }> }) {
  const { role } = await requirePage("/parts/[id]");
  const { id } = await params;
  return (
    <Suspense>
      <PartPage id={id} mayWrite={can(role, "parts:write")} mayPlan={can(role, "plans:write")} maySeePlans={can(role, "plans:read")} />
    </Suspense>
  );
}
