"use client";
import { useRouter } from "next/navigation";
import { useEffect, useState } from "react";
import { Button } from "@/components/ui/Button";
import { Notice } from "@/components/ui/Notice";
import { asSentence } from "@/lib/format/asSentence";
import { usePlanJob } from "@/lib/queries/planJobs";
import { usePlanOwnOrder } from "@/lib/queries/plans";
import type { PlanDetail } from "@/lib/schemas/views";
import { timeDifference } from "../timeDifference";
import type { TriedOrder } from "./orderMessages";
import type { OrderCheck } from "./useOrderCheck";

interface OwnOrderVerdictProps {
  readonly detail: PlanDetail;
  readonly tried: TriedOrder;
  readonly check: OrderCheck;
  readonly mayWrite: boolean;
}

/** What the order comes to as a whole, and the way to make it a plan. */
export function OwnOrderVerdict({ detail, tried, check, mayWrite }: OwnOrderVerdictProps) {
  const router = useRouter();
  const start = usePlanOwnOrder(detail.id);
  const [asked, setAsked] = useState<TriedOrder | null>(null);
  const job = usePlanJob(start.data?.id ?? null);
  const planId = job.data?.state === "done" ? job.data.planId : null;
  useEffect(() => { if (planId !== null && planId !== detail.id) router.push(`/plans/${planId}`); }, [planId, detail.id, router]);
  const ofThis = asked === tried;
  const plan = (): void => {
    setAsked(tried);
    start.mutate({ order: [...tried.order], wishes: [...tried.wishes] });
  };
  return (
    <div className="space-y-3" aria-live="polite">
      <Verdict detail={detail} check={check} />
      {start.error === null || !ofThis ? null : <Notice tone="wrong" title="The order was not planned" live>{start.error.message}</Notice>}
      {job.data?.state === "failed" && ofThis ? <Notice tone="wrong" title="The order was not planned" live>{job.data.message}</Notice> : null}
      {mayWrite ? <Button busy={start.isPending || (ofThis && job.data?.state === "running")} disabled={check.failure !== null && check.whole} onClick={plan}>Plan this order</Button> : null}
    </div>
  );
}

function Verdict({ detail, check }: Pick<OwnOrderVerdictProps, "detail" | "check">) {
  const { failure, looking, whole, planning, plan } = check;
  if (looking) return <Notice tone="note" title="Looking the order over…" />;
  if (failure !== null) {
    const places = failure.strokes[0]?.wouldWork ?? [];
    return (
      <Notice tone="wrong" title={`Step ${failure.step ?? failure.done.length + 1} cannot be made there`}>
        {whole ? null : <p>Not on the likeliest V. The other dies are still being looked at…</p>}
        {places.length === 0 ? "No other place in the order would help this stroke by itself." : <ul>{places.map((place, index) => <li key={index}>It would work {placeWords(place.before, place.after)}.</li>)}</ul>}
      </Notice>
    );
  }
  if (planning || plan === null) return <Notice tone="good" title="Every step can be made">Working out the bed and the time…</Notice>;
  if (plan.steps.length === 0) {
    return <Notice tone="wrong" title="Each step can be made, but not all on one bed">{plan.reasons.map((reason, index) => <p key={index}>{asSentence(reason.message, [...reason.bends, ...reason.tools])}</p>)}</Notice>;
  }
  return <Notice tone="good" title="This order works">{timeDifference(detail.plan, plan)}</Notice>;
}

function placeWords(before: readonly string[], after: readonly string[]): string {
  return [...(before.length > 0 ? [`before ${before.join(" and ")}`] : []), ...(after.length > 0 ? [`after ${after.join(" and ")}`] : [])].join(" and ");
}
