import { Suspense } from "react";
import { PartList } from "@/components/parts/list/PartList";
import { can } from "@/lib/auth/permissions";
import { requirePage } from "@/lib/auth/requirePage";

export const metadata = { title: "Parts" };

export default async function PartsPage() {
  const person = await requirePage("/parts");
  return <Suspense><PartList mayWrite={can(person.role, "parts:write")} /></Suspense>;
}
