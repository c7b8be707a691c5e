"use client";
import { useState } from "react";
import { usePlanJobList } from "@/lib/queries/planJobs";
import type { PlanJobListQuery } from "@/lib/schemas/planInputs";
import type { PlanJobView } from "@/lib/schemas/views";
import { JobLine } from "./JobLine";

interface JobsUnderWayProps {
  /** Of one part, about one plan, or all. */
  readonly of: PlanJobListQuery;
  readonly mayWrite: boolean;
  /** Jobs shown elsewhere on the page. */
  readonly except?: (job: PlanJobView) => boolean;
}

/** The jobs that run, found again whenever the page is opened, and how those ended that were seen running here. */
export function JobsUnderWay({ of, mayWrite, except }: JobsUnderWayProps) {
  const { data } = usePlanJobList(of);
  const [seen, setSeen] = useState<ReadonlySet<string>>(new Set());
  const jobs = (data ?? []).filter((job) => except?.(job) !== true);
  const unseen = jobs.filter((job) => job.state === "running" && !seen.has(job.id));
  if (unseen.length > 0) setSeen(new Set([...seen, ...unseen.map(({ id }) => id)]));
  const shown = jobs.filter((job) => job.state === "running" || seen.has(job.id));
  if (shown.length === 0) return null;
  return (
    <section aria-label="Under way" className="mb-5 space-y-2 print:hidden">
      {shown.map((job) => <JobLine key={job.id} job={job} mayWrite={mayWrite} here={of.planId} />)}
    </section>
  );
}
