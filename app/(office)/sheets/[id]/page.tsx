import type { Metadata } from "next";
import { SheetScreen } from "@/components/sheets/SheetScreen";
import { can } from "@/lib/auth/permissions";
import { requirePage } from "@/lib/auth/requirePage";

export const metadata: Metadata = { title: "Setup sheet" };

export default async function SheetPage({ params }: { readonly params: Promise<{ id: string }> }) {
  const { role } = await requirePage("/sheets/[id]");
  return <SheetScreen id={(await params).id} mayRelease={can(role, "sheets:release")} maySeePlans={can(role, "plans:read")} maySeeFloor={can(role, "floor:read")} />;
}
