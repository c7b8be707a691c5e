"use client";
import { useRouter } from "next/navigation";
import { useEffect } from "react";
import { Button } from "@/components/ui/Button";
import { Notice } from "@/components/ui/Notice";
import { usePlanJob } from "@/lib/queries/planJobs";
import { useSearchOn } from "@/lib/queries/plans";

/** Seconds offered to search on. */
const MORE = [60, 300] as const;

/** Gives a search that was cut short more time; the plan it comes to is a plan of its own, and is opened. */
export function SearchOn({ planId, gap }: { readonly planId: string; readonly gap: number | null }) {
  const router = useRouter();
  const start = useSearchOn(planId);
  const job = usePlanJob(start.data?.id ?? null);
  const found = job.data?.state === "done" ? job.data.planId : null;
  useEffect(() => { if (found !== null && found !== planId) router.push(`/plans/${found}`); }, [found, planId, router]);
  const busy = start.isPending || job.data?.state === "running";
  return (
    <div className="space-y-2">
      <p className="text-ink-soft">{gap === null ? "More time may find a plan, or prove that there is none." : `The gap is ${(gap * 100).toFixed(1)} %: more time may find a quicker plan, or prove this one.`}</p>
      <div className="flex flex-wrap gap-2">{MORE.map((seconds) => <Button key={seconds} look="plain" busy={busy} onClick={() => start.mutate(seconds)}>Search {seconds < 120 ? `${seconds} s` : `${seconds / 60} min`} longer</Button>)}</div>
      {start.error === null ? null : <Notice tone="wrong" title="The search was not started" live>{start.error.message}</Notice>}
    </div>
  );
}
