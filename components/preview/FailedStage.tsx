"use client";
import { useMemo } from "react";
import { createSheetFormat } from "@/lib/sheet/createSheetFormat";
import { failedStep, type FailedStepFacts } from "@/lib/sheet/failedStep";
import { stepPicture } from "@/lib/sheet/stepPicture";
import { mmPer } from "@/bending/core/units";
import { StepDrawing } from "./StepDrawing";

/** The moment at which a stroke meets something, cut where it is met: the faces in the way marked, with the angle and the depth. */
export function FailedStage({ facts, className }: { readonly facts: FailedStepFacts; readonly className?: string }) {
  const shown = useMemo(() => failedStep(facts), [facts]);
  const picture = useMemo(() => (shown ? stepPicture(shown.model, shown.step, { angle: shown.angle, lift: 0 }, shown.met) : null), [shown]);
  const { evidence } = facts.reason;
  if (picture === null || evidence === undefined) return null;
  const format = createSheetFormat(facts.units);
  const per = mmPer(facts.units);
  const name = facts.bends.join(" + ");
  return (
    <figure className={className}>
      <StepDrawing picture={picture} label={`Section through ${name} where it meets something`} className="h-80 w-full border border-rule-strong bg-sheet p-2" />
      <figcaption className="mt-1 text-sm text-ink-soft">
        {name}, {facts.front} in front, <span className="num">{facts.punch}</span> on <span className="num">{facts.die}</span>; at <span className="num">{format.angle(evidence.strokeAngle)}</span> of the stroke{" "}
        <span className="mr-1 inline-block h-2.5 w-5 bg-brick align-middle" aria-hidden />{facts.reason.faces.join(" and ")} {facts.reason.faces.length > 1 ? "are" : "is"} <span className="num">{format.fine(evidence.depth * per)}</span> too near, cut <span className="num">{format.place(((evidence.zFrom + evidence.zTo) / 2) * per)} {facts.units}</span> from the bend’s middle.
      </figcaption>
    </figure>
  );
}
