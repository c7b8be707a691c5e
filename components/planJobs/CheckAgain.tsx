"use client";
import { ShieldCheck } from "lucide-react";
import { useQueryClient } from "@tanstack/react-query";
import { useEffect } from "react";
import { Button } from "@/components/ui/Button";
import { useToast } from "@/components/ui/ToastProvider";
import { usePlanJob } from "@/lib/queries/planJobs";
import { planOptions, useCheckPlan } from "@/lib/queries/plans";

/** Has the stored plan gone through again with today's machine, tools and pieces. */
export function CheckAgain({ planId }: { readonly planId: string }) {
  const client = useQueryClient();
  const toast = useToast();
  const start = useCheckPlan(planId);
  const job = usePlanJob(start.data?.id ?? null);
  const state = job.data?.state ?? null;
  useEffect(() => {
    if (state === "done") void client.invalidateQueries({ queryKey: planOptions(planId).queryKey });
    if (state === "failed") toast("wrong", "The plan was not looked over", "It broke off; try again.");
  }, [state, client, planId, toast]);
  return (
    <Button look="plain" icon={<ShieldCheck aria-hidden />} busy={start.isPending || state === "running"}
      onClick={() => start.mutate(undefined, { onError: (problem) => toast("wrong", "The plan was not looked over", problem.message) })}>Check again</Button>
  );
}
