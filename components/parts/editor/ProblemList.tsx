"use client";
import type { FieldProblem } from "@/bending/core/problem";
import { Notice } from "@/components/ui/Notice";
import type { PartDraft } from "../draft/partDraft";
import { fieldId } from "./fieldId";
import { pathName } from "./pathName";

/** Everything that must be mended, each leading to its field. */
export function ProblemList({ problems, draft }: { readonly problems: readonly FieldProblem[]; readonly draft: PartDraft }) {
  if (problems.length === 0) return null;
  const goTo = (path: string) => { document.getElementById(fieldId(path))?.focus(); };
  return (
    <Notice tone="wrong" title={problems.length === 1 ? "One thing must be mended" : `${problems.length} things must be mended`}>
      <ul className="space-y-1">
        {problems.slice(0, 12).map((problem) => (
          <li key={`${problem.path} ${problem.message}`}>
            {problem.path === "" ? null : <button type="button" onClick={() => goTo(problem.path)} className="font-medium text-ink underline decoration-rule-strong underline-offset-2 hover:decoration-ink">{pathName(problem.path, draft)}</button>}
            {problem.path === "" ? null : ": "}{problem.message}
          </li>
        ))}
      </ul>
      {problems.length > 12 ? <p>and {problems.length - 12} more</p> : null}
    </Notice>
  );
}
