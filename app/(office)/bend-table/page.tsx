import { Suspense } from "react";
import { ValueList } from "@/components/bendTable/values/ValueList";
import { can } from "@/lib/auth/permissions";
import { requirePage } from "@/lib/auth/requirePage";

export const metadata = { title: "Bend table" };

export default async function BendTablePage() {
  const { role } = await requirePage("/bend-table");
  return <Suspense><ValueList mayWrite={can(role, "bendTable:write")} /></Suspense>;
}
