"use client";
import Link from "next/link";
import { Button } from "@/components/ui/Button";
import { buttonClasses } from "@/components/ui/buttonClasses";
import { Notice } from "@/components/ui/Notice";
import { ProgressBar } from "@/components/ui/ProgressBar";
import { formatMoment } from "@/lib/format/formatMoment";
import { useCancelPlanJob, useFinishPlanJob } from "@/lib/queries/planJobs";
import type { PlanJobView } from "@/lib/schemas/views";
import { jobWords } from "./jobWords";

/** One job: how far it is with the ways to end it, or what became of it. */
export function JobLine({ job, mayWrite, here }: { readonly job: PlanJobView; readonly mayWrite: boolean; readonly here?: string | undefined }) {
  const cancel = useCancelPlanJob();
  const finish = useFinishPlanJob();
  const words = jobWords[job.kind];
  const problem = cancel.error ?? finish.error;
  if (job.state === "failed") return <Notice tone="wrong" title={`${words.doing} ${job.subject} failed`} live>{job.message}</Notice>;
  if (job.state === "cancelled") return <Notice tone="note" title={`${words.doing} ${job.subject} was stopped`} live>Nothing was kept.</Notice>;
  if (job.state === "done") {
    const elsewhere = job.planId !== null && job.planId !== here;
    return (
      <Notice tone="good" title={`${words.doing} ${job.subject}: done`} live>
        <span className="flex flex-wrap items-center gap-3">{job.message}{elsewhere ? <Link href={`/plans/${job.planId ?? ""}`} className={buttonClasses("plain", "small")}>Open the plan</Link> : null}</span>
      </Notice>
    );
  }
  return (
    <div className="border border-l-4 border-rule border-l-accent bg-sheet p-3">
      <div className="flex flex-wrap items-center justify-between gap-x-4 gap-y-2">
        <p className="font-semibold">{words.doing} {job.subject}</p>
        {mayWrite ? (
          <div className="flex flex-wrap gap-2">
            {words.finish === null ? null : <Button look="plain" size="small" busy={finish.isPending} onClick={() => finish.mutate(job.id)}>{words.finish}</Button>}
            <Button look="danger" size="small" busy={cancel.isPending} onClick={() => cancel.mutate(job.id)}>Stop, keep nothing</Button>
          </div>
        ) : null}
      </div>
      <div className="mt-2"><ProgressBar label={words.doing} value={job.progress} /></div>
      <p className="mt-1 text-sm text-ink-soft"><span role="status">{job.message}</span>; started {formatMoment(job.startedAt)} by {job.by}</p>
      {problem === null ? null : <p className="mt-1 text-sm text-brick-ink" role="alert">{problem.message}</p>}
    </div>
  );
}
