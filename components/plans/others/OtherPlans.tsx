"use client";
import { useRouter } from "next/navigation";
import { useState } from "react";
import { Button } from "@/components/ui/Button";
import { EmptyState } from "@/components/ui/EmptyState";
import { useToast } from "@/components/ui/ToastProvider";
import { classes } from "@/components/ui/classes";
import { useChooseAlternative } from "@/lib/queries/plans";
import type { PlanDetail } from "@/lib/schemas/views";
import { comparisonRows, type ComparedPlan } from "./comparisonRows";

/** The plan beside the other plans that its search gave: what differs is marked, and one of them can be made the plan. */
export function OtherPlans({ detail, mayWrite }: { readonly detail: PlanDetail; readonly mayWrite: boolean }) {
  const { plan } = detail;
  const others = plan.alternatives ?? [];
  const router = useRouter();
  const toast = useToast();
  const choose = useChooseAlternative(detail.id);
  const [asked, setAsked] = useState<number | null>(null);
  const take = (index: number): void => {
    setAsked(index);
    choose.mutate(index, {
      onSuccess: (chosen) => router.push(`/plans/${chosen.id}`),
      onError: (problem) => toast("wrong", "The other plan was not taken", problem.message),
    });
  };
  if (others.length === 0) {
    return <EmptyState title="No other plan was kept">{detail.origin === "planned" ? "None was asked for, or the search found no different one that works. Plan the part again with more other plans or more time." : "Only a search of the planner gives other plans to compare. Open the plan that this one was made from."}</EmptyState>;
  }
  const plans: readonly ComparedPlan[] = [plan, ...others];
  return (
    <div className="overflow-x-auto border-y border-ink" tabIndex={0} role="region" aria-label="Plans beside each other">
      <table className="w-full border-collapse text-left text-sm">
        <thead>
          <tr className="border-b border-rule-strong align-bottom">
            <td className="w-44 py-2 pr-4" />
            {plans.map((_, index) => (
              <th key={index} scope="col" className="min-w-52 px-3 py-2 font-semibold">
                {index === 0 ? "This plan" : `Other plan ${index}`}
                {index > 0 && mayWrite ? <span className="mt-1 block"><Button look="plain" size="small" busy={choose.isPending && asked === index - 1} onClick={() => take(index - 1)}>Make it the plan</Button></span> : null}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {comparisonRows(plans).map((row) => (
            <tr key={row.label} className="border-b border-rule align-top last:border-b-0">
              <th scope="row" className="py-2 pr-4 font-medium text-ink-soft">{row.label}</th>
              {row.cells.map((cell, index) => (
                <td key={index} className={classes("px-3 py-2", row.number && "num", cell.differs && "bg-accent-wash")}>
                  {cell.lines.map((line, at) => <span key={at} className="block">{line}</span>)}
                  {cell.note === "" ? null : <span className="block text-ink-soft">{cell.note}</span>}
                </td>
              ))}
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}
