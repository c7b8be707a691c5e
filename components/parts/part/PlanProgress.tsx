"use client";
import { useRouter } from "next/navigation";
import { useEffect } from "react";
import { Button } from "@/components/ui/Button";
import { DialogBox } from "@/components/ui/DialogBox";
import { Notice } from "@/components/ui/Notice";
import { ProgressBar } from "@/components/ui/ProgressBar";
import { useCancelPlanJob, useFinishPlanJob, usePlanJob } from "@/lib/queries/planJobs";

interface PlanProgressProps {
  readonly jobId: string;
  readonly name: string;
  readonly onAgain: () => void;
  readonly onClose: () => void;
}

/** The planner at work: how far it is, and a way to stop it. A plan that is found is shown at once. */
export function PlanProgress({ jobId, name, onAgain, onClose }: PlanProgressProps) {
  const router = useRouter();
  const job = usePlanJob(jobId);
  const cancel = useCancelPlanJob();
  const finish = useFinishPlanJob();
  const planId = job.data?.planId ?? null;
  const state = job.data?.state ?? "running";
  useEffect(() => { if (state === "done" && planId !== null) router.push(`/plans/${planId}`); }, [state, planId, router]);
  const running = state === "running" || (state === "done" && planId !== null);
  return (
    <DialogBox open onOpenChange={(open) => { if (!open) onClose(); }} title={`Planning ${name}`}
      actions={running
        ? <><Button look="plain" onClick={onClose}>Go on without waiting</Button><Button look="plain" busy={finish.isPending || finish.isSuccess} onClick={() => finish.mutate(jobId)}>Keep the best so far</Button><Button look="danger" busy={cancel.isPending} onClick={() => cancel.mutate(jobId)}>Stop planning</Button></>
        : <><Button look="plain" onClick={onClose}>Close</Button><Button onClick={onAgain}>Try again</Button></>}>
      <div className="space-y-3">
        {running ? <ProgressBar label="Planning" value={state === "done" ? 1 : (job.data?.progress ?? null)} /> : null}
        <p role="status" className="min-h-6 text-ink-soft">{running ? (job.data?.message ?? "Starting") : null}</p>
        {job.isError ? <Notice tone="wrong" title="The planner cannot be reached" live>{job.error.message}</Notice> : null}
        {cancel.error === null ? null : <Notice tone="wrong" title="It could not be stopped" live>{cancel.error.message}</Notice>}
        {finish.error === null ? null : <Notice tone="wrong" title="It could not be ended" live>{finish.error.message}</Notice>}
        {state === "failed" ? <Notice tone="wrong" title="Planning ended without a plan" live>{job.data?.message}</Notice> : null}
        {state === "cancelled" ? <Notice tone="note" title="Planning was stopped" live>No plan was kept.</Notice> : null}
      </div>
    </DialogBox>
  );
}
