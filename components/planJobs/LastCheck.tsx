"use client";
import { Notice } from "@/components/ui/Notice";
import type { PlanDocument } from "@/bending/plan/planDocument";
import { asSentence } from "@/lib/format/asSentence";
import { formatMoment } from "@/lib/format/formatMoment";
import type { PlanCheckView } from "@/lib/schemas/planJobViews";

interface LastCheckProps {
  readonly check: PlanCheckView | null;
  readonly plan: Pick<PlanDocument, "steps">;
}

/** When a plan was last looked over again: that it holds, or what no longer does and why; and what has changed since it was made. */
export function LastCheck({ check, plan }: LastCheckProps) {
  if (check === null) return null;
  const { engine, wrong, changed } = check;
  const when = `${formatMoment(check.checkedAt)}${check.checkedBy === "" ? "" : ` by ${check.checkedBy}`}`;
  const newer = engine.planned !== engine.now;
  return (
    <div className="mb-5">
      <Notice tone={check.holds ? "good" : "wrong"} title={check.holds ? `Looked over ${when}: the plan holds` : `Looked over ${when}: the plan does not hold any more`}>
        {check.holds ? <p>All {check.steps} steps clear the tools, pieces and settings of that day, built from the plan’s own numbers.</p> : (
          <ul className="list-disc space-y-1 pl-5">{wrong.map(({ step, reason }, index) => (
            <li key={index}>{step === null ? null : <span className="font-medium">Step {step + 1}{named(plan, step)}: </span>}{asSentence(reason.message, [...reason.bends, ...reason.tools])}</li>
          ))}</ul>
        )}
        <p>{newer ? <>Planned by <span className="num">{engine.planned}</span>, looked over by <span className="num">{engine.now}</span>: planning again may find a better one.</> : <>Planned and looked over by <span className="num">{engine.now}</span>.</>}</p>
        {changed.length === 0 ? null : (
          <details>
            <summary className="text-accent-ink">{changed.length === 1 ? "One setting has" : `${changed.length} settings have`} changed since it was planned{check.holds ? "; it holds all the same, whether it is still the quickest is not looked at" : ""}</summary>
            <table className="mt-1 border-collapse text-sm">
              <thead><tr>{["What", "As planned", "Now"].map((head) => <th key={head} scope="col" className="pr-6 text-left font-medium text-ink-soft">{head}</th>)}</tr></thead>
              <tbody>{changed.map(({ what, before, now }) => <tr key={what} className="border-t border-rule"><th scope="row" className="pr-6 text-left font-normal">{what}</th><td className="num pr-6">{before}</td><td className="num">{now}</td></tr>)}</tbody>
            </table>
          </details>
        )}
      </Notice>
    </div>
  );
}

const named = ({ steps }: LastCheckProps["plan"], index: number): string => {
  const step = steps[index];
  return step === undefined ? "" : `, ${step.bends.join(" + ")}`;
};
