"use client";
import Link from "next/link";
import { Notice } from "@/components/ui/Notice";
import { PageHeader } from "@/components/ui/PageHeader";
import { StateMark } from "@/components/ui/StateMark";
import { createSheetFormat } from "@/lib/sheet/createSheetFormat";
import { usePlan } from "@/lib/queries/plans";
import type { PlanDetail } from "@/lib/schemas/views";
import { MakeSheet } from "./MakeSheet";
import { planStatus } from "./planStatus";
import { PlanReasons } from "./PlanReasons";
import { PlanWork } from "./PlanWork";

/** One stored plan. */
export function PlanScreen({ id, mayWrite }: { readonly id: string; readonly mayWrite: boolean }) {
  const { data, error } = usePlan(id);
  if (error) return <Notice tone="wrong" title="This plan cannot be shown">{error.message}</Notice>;
  if (!data) return <p className="py-10 text-ink-faint">Loading the plan…</p>;
  const works = data.plan.steps.length > 0;
  return (
    <>
      <PlanHeader detail={data} mayWrite={mayWrite && works} />
      {works ? <PlanWork detail={data} /> : <PlanReasons detail={data} mayWrite={mayWrite} />}
    </>
  );
}

function PlanHeader({ detail, mayWrite }: { readonly detail: PlanDetail; readonly mayWrite: boolean }) {
  const { plan } = detail;
  const { tone, word, sentence } = planStatus(plan.status, plan.gap);
  const format = createSheetFormat(plan.units);
  const works = plan.steps.length > 0;
  return (
    <PageHeader kicker={<>Plan of <Link href={`/parts/${detail.partId}`} className="num underline">{detail.partNumber}</Link></>}
      title={detail.partName} summary={sentence} actions={mayWrite ? <MakeSheet planId={detail.id} sheets={detail.sheets} /> : undefined}
      facts={[
        { label: "Status", value: <StateMark tone={tone}>{word}</StateMark> },
        { label: "Revision", value: <span className="num">{detail.revision}</span> },
        { label: "Brake", value: detail.machine },
        { label: "Batch", value: <span className="num">{plan.batch}</span> },
        ...(works ? [
          { label: "Setup", value: <span className="num">{format.time(plan.seconds.setup)}</span> },
          { label: "A part", value: <span className="num">{format.time(plan.seconds.perPart)}</span> },
          { label: "Batch in all", value: <span className="num">{format.time(plan.seconds.total)}</span> },
        ] : []),
      ]} />
  );
}
