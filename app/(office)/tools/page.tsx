import { Suspense } from "react";
import { ToolList } from "@/components/tooling/list/ToolList";
import { can } from "@/lib/auth/permissions";
import { requirePage } from "@/lib/auth/requirePage";

export const metadata = { title: "Tools" };

export default async function ToolsPage() {
  const { role } = await requirePage("/tools");
  return <Suspense><ToolList mayWrite={can(role, "tools:write")} /></Suspense>;
}
