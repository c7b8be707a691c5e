"use client";
import { usePathname, useRouter, useSearchParams } from "next/navigation";
import { JobsUnderWay } from "@/components/planJobs/JobsUnderWay";
import { Notice } from "@/components/ui/Notice";
import { TabSet } from "@/components/ui/TabSet";
import { usePlan } from "@/lib/queries/plans";
import type { PlanDetail } from "@/lib/schemas/views";
import { FlatNumbers } from "./FlatNumbers";
import { OtherPlans } from "./others/OtherPlans";
import { OwnOrder } from "./own/OwnOrder";
import { PlanHeader } from "./PlanHeader";
import { PlanProof } from "./PlanProof";
import { PlanReasons } from "./PlanReasons";
import { PlanWork } from "./PlanWork";
import { ToleranceTable } from "./ToleranceTable";

/** One stored plan. The tab stands in the address, so that it is there again on coming back. */
export function PlanScreen({ id, mayWrite }: { readonly id: string; readonly mayWrite: boolean }) {
  const { data, error } = usePlan(id);
  if (error) return <Notice tone="wrong" title="This plan cannot be shown">{error.message}</Notice>;
  if (!data) return <p className="py-10 text-ink-faint">Loading the plan…</p>;
  return (
    <>
      <PlanHeader detail={data} mayWrite={mayWrite} />
      <JobsUnderWay of={{ planId: id }} mayWrite={mayWrite} except={({ kind }) => kind !== "plan"} />
      <PlanTabs key={id} detail={data} mayWrite={mayWrite} />
    </>
  );
}

function PlanTabs({ detail, mayWrite }: { readonly detail: PlanDetail; readonly mayWrite: boolean }) {
  const router = useRouter();
  const path = usePathname();
  const asked = useSearchParams().get("view");
  const works = detail.plan.steps.length > 0;
  const others = detail.plan.alternatives?.length ?? 0;
  const tabs = [
    works ? { value: "plan", label: "Order and bed", content: <PlanWork detail={detail} /> } : { value: "plan", label: "What stands in the way", content: <PlanReasons detail={detail} mayWrite={mayWrite} /> },
    { value: "own", label: "Your own order", content: <OwnOrder detail={detail} mayWrite={mayWrite} /> },
    ...(works ? [{ value: "others", label: `Other plans (${others})`, content: <OtherPlans detail={detail} mayWrite={mayWrite} /> }] : []),
    ...(works ? [{ value: "tolerances", label: "Tolerances", content: <ToleranceTable detail={detail} /> }] : []),
    { value: "flat", label: "Flat", content: <FlatNumbers plan={detail.plan} /> },
    { value: "proof", label: works ? "Proof and time" : "Proof", content: <PlanProof detail={detail} mayWrite={mayWrite} /> },
  ];
  const shown = tabs.find(({ value }) => value === asked)?.value ?? "plan";
  return <TabSet label="The plan" tabs={tabs} value={shown} onChange={(view) => router.replace(view === "plan" ? path : `${path}?view=${view}`, { scroll: false })} />;
}
