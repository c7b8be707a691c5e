import { Suspense } from "react";
import { Coverage } from "@/components/bendTable/coverage/Coverage";
import { can } from "@/lib/auth/permissions";
import { requirePage } from "@/lib/auth/requirePage";

export const metadata = { title: "Coverage of the bend table" };

export default async function CoveragePage() {
  const { role } = await requirePage("/bend-table/coverage");
  return <Suspense><Coverage mayWrite={can(role, "bendTable:write")} /></Suspense>;
}
