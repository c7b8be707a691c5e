"use client";
import { useDeferredValue, useMemo } from "react";
import type { FieldProblem } from "@/bending/core/problem";
import type { MaterialFacts } from "@/bending/handbook/material";
import { Button } from "@/components/ui/Button";
import { Notice } from "@/components/ui/Notice";
import type { PartDraft } from "../draft/partDraft";
import { ProblemList } from "../editor/ProblemList";
import { fittingRadius } from "./fittingRadius";
import type { FoundDrawing } from "./useDrawing";

interface ImportProblemsProps {
  readonly draft: PartDraft;
  readonly found: FoundDrawing;
  readonly problems: readonly FieldProblem[];
  readonly materials: readonly MaterialFacts[];
  /** The unit has still to be said. */
  readonly unitOpen: boolean;
  readonly update: (change: (old: PartDraft) => PartDraft) => void;
}

/** What keeps the drawing from becoming a part, and what would help. */
export function ImportProblems({ draft, found, problems, materials, unitOpen, update }: ImportProblemsProps) {
  const settled = useDeferredValue(draft);
  const tight = problems.some(({ path }) => path.startsWith("flat.bends"));
  const fitting = useMemo(() => (tight ? fittingRadius(settled, materials) : null), [tight, settled, materials]);
  return (
    <>
      {unitOpen ? <Notice tone="wrong" title="Say which unit the drawing is in" live>What its header says does not go with its sizes.</Notice> : null}
      {draft.flat !== null ? <ProblemList problems={problems} draft={draft} /> : (
        <Notice tone="wrong" title="No closed contour was found">
          <p>{found.flat.leftovers.length === 0 ? "No lines are taken as cut; choose them below." : "The lines dashed in the drawing close nothing. Close larger gaps, or take other lines as cut."}</p>
        </Notice>
      )}
      {fitting === null ? null : (
        <Notice tone="note" title={`With an inside radius of ${fitting.insideRadius} ${fitting.units} every bend fits`}>
          <p>A flat is drawn for a certain radius; with a larger one the bends reach farther than its author left room for.</p>
          <Button look="plain" size="small" onClick={() => update(() => fitting)}>Take {fitting.insideRadius} {fitting.units}</Button>
        </Notice>
      )}
    </>
  );
}
