import { Suspense } from "react";
import { TrialList } from "@/components/bendTable/trials/TrialList";
import { can } from "@/lib/auth/permissions";
import { requirePage } from "@/lib/auth/requirePage";

export const metadata = { title: "Trials" };

export default async function TrialsPage() {
  const { role } = await requirePage("/bend-table/trials");
  return <Suspense><TrialList mayWrite={can(role, "bendTable:write")} mayJudge={can(role, "bendTable:judge")} /></Suspense>;
}
