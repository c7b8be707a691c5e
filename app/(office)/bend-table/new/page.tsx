import { Suspense } from "react";
import { TrialEntry } from "@/components/bendTable/entry/TrialEntry";
import { requirePage } from "@/lib/auth/requirePage";

export const metadata = { title: "Enter trials" };

export default async function EnterTrialsPage() {
  const { id, name } = await requirePage("/bend-table/new");
  return <Suspense><TrialEntry person={{ id, name }} /></Suspense>;
}
