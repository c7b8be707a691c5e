"use client";
import Link from "next/link";
import { PageHeader } from "@/components/ui/PageHeader";
import { StateMark } from "@/components/ui/StateMark";
import { createSheetFormat } from "@/lib/sheet/createSheetFormat";
import type { PlanDetail, PlanOrigin } from "@/lib/schemas/views";
import { CheckAgain } from "@/components/planJobs/CheckAgain";
import { LastCheck } from "@/components/planJobs/LastCheck";
import { MakeSheet } from "./MakeSheet";
import { planStatus } from "./planStatus";

/** What a plan is of, how good it is known to be, and what can be done with it. */
export function PlanHeader({ detail, mayWrite }: { readonly detail: PlanDetail; readonly mayWrite: boolean }) {
  const { plan } = detail;
  const { tone, word, sentence } = planStatus(plan.status, plan.gap, detail.origin);
  const format = createSheetFormat(plan.units);
  const works = plan.steps.length > 0;
  return (
    <>
      <PageHeader kicker={<>Plan of <Link href={`/parts/${detail.partId}`} className="num underline">{detail.partNumber}</Link>{originWords(detail)}</>}
        title={detail.partName} summary={sentence}
        actions={mayWrite && works ? <><CheckAgain planId={detail.id} /><MakeSheet planId={detail.id} sheets={detail.sheets} /></> : undefined}
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
      {works ? <LastCheck check={detail.lastCheck} plan={plan} /> : null}
    </>
  );
}

const origins: Record<PlanOrigin, string> = { planned: "", "own order": ", along a person’s own order", chosen: ", chosen among other plans" };

function originWords({ origin, fromPlanId }: PlanDetail) {
  return <>{origins[origin]}{fromPlanId === null ? null : <>; made from <Link href={`/plans/${fromPlanId}`} className="underline">this plan</Link></>}</>;
}
