"use client";
import { Lightbulb } from "lucide-react";
import type { ReactNode } from "react";
import type { PlanChange } from "@/bending/plan/planChange";
import { JobLine } from "@/components/planJobs/JobLine";
import { Button } from "@/components/ui/Button";
import { Notice } from "@/components/ui/Notice";
import { usePlanJobList } from "@/lib/queries/planJobs";
import { useFindChanges } from "@/lib/queries/plans";
import type { PlanDetail, PlanJobView } from "@/lib/schemas/views";
import type { TriedOrder } from "../own/orderMessages";
import { ChangeList } from "./ChangeList";

interface FindChangesProps {
  readonly detail: PlanDetail;
  readonly mayWrite: boolean;
  /** A person's own order that fails; null: the plan itself. */
  readonly tried: TriedOrder | null;
  readonly act?: (change: PlanChange) => ReactNode;
}

/** Looks on request for the least changes with which it would work; what was found before is there again. */
export function FindChanges({ detail, mayWrite, tried, act }: FindChangesProps) {
  const start = useFindChanges(detail.id);
  const jobs = usePlanJobList({ planId: detail.id });
  const asked = tried === null ? null : tried.order.join(" ");
  const started = jobs.data?.find(({ id }) => id === start.data?.id);
  const found = jobs.data?.flatMap(({ result }) => (result?.kind === "why" && (result.order?.join(" ") ?? null) === asked ? [result] : []))[0];
  const kept = tried === null && detail.plan.changes !== undefined ? { changes: detail.plan.changes, complete: true } : null;
  const shown = found ?? kept;
  const running = started?.state === "running" ? started : jobs.data?.find(isSearch);
  return (
    <div className="space-y-3">
      {shown ? <ChangeList changes={shown.changes} complete={shown.complete} {...(act ? { act } : {})} /> : null}
      {running ? <JobLine job={running} mayWrite={mayWrite} here={detail.id} /> : null}
      {started?.state === "failed" ? <JobLine job={started} mayWrite={mayWrite} here={detail.id} /> : null}
      {start.error === null ? null : <Notice tone="wrong" title="It was not looked for" live>{start.error.message}</Notice>}
      {mayWrite && !running ? (
        <Button look="plain" icon={<Lightbulb aria-hidden />} busy={start.isPending} onClick={() => start.mutate(tried === null ? {} : { order: [...tried.order], wishes: [...tried.wishes] })}>
          {shown ? "Look again" : "Find what would make it work"}
        </Button>
      ) : null}
    </div>
  );
}

const isSearch = ({ kind, state }: PlanJobView): boolean => kind === "why" && state === "running";
