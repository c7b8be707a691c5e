"use client";
import { lazy, Suspense, useMemo, useState, type KeyboardEvent } from "react";
import { createSheetFormat } from "@/lib/sheet/createSheetFormat";
import type { PlanModel, StepModel } from "@/lib/sheet/planModel";
import { stepPicture } from "@/lib/sheet/stepPicture";
import { strokeAt } from "@/lib/sheet/strokeAt";
import { upSide } from "@/lib/sheet/upSide";
import { DrawnOnFailure } from "./DrawnOnFailure";
import { StageBar, type StageLook } from "./StageBar";
import type { StageTheme } from "./stageColours";
import { StepDrawing } from "./StepDrawing";
import { StrokeBar } from "./StrokeBar";
import { useHasWebGl } from "./useHasWebGl";
import { useStroke } from "./useStroke";

const StepScene = lazy(() => import("./StepScene"));

interface StepStageProps {
  readonly model: PlanModel;
  /** Index of the step shown. */
  readonly step: number;
  readonly onStep: (step: number) => void;
  readonly theme?: StageTheme;
  /** At the brake: only play and scrub, in sizes for gloves. */
  readonly large?: boolean;
  readonly className?: string;
}

/** The machine at every moment of every step: scrub, play, orbit, cut open; in 3D or drawn. Space plays, arrows scrub, page keys change the step. */
export function StepStage({ model, step, onStep, theme = "light", large = false, className }: StepStageProps) {
  const able = useHasWebGl();
  const [lost, setLost] = useState(false);
  const [look, setLook] = useState<StageLook>({ preset: "3d", section: false, drawn: false });
  const stroke = useStroke(step, model.steps.length, onStep);
  const current = model.steps[step];
  if (!current) return null;
  const canDraw3d = able === true && !lost;
  const drawn = <DrawnStep model={model} step={current} at={stroke.at} number={step + 1} />;
  return (
    <div className={className ?? "flex flex-col border border-rule-strong bg-sheet"} onKeyDown={(event) => onKey(event, stroke, step, model.steps.length, onStep)}>
      {large ? null : <StageBar look={look} onLook={setLook} canDraw3d={canDraw3d} />}
      <div className="relative min-h-72 grow overflow-hidden outline-offset-[-3px]" tabIndex={0} role="group" aria-label={`Step ${step + 1} of ${model.steps.length}: space plays, left and right scrub, page keys change the step`}>
        <div className="absolute inset-0">
          {able === null ? null : !canDraw3d || look.drawn ? drawn : (
            <DrawnOnFailure instead={drawn}>
              <Suspense fallback={<p className="p-4 text-ink-faint">Loading the 3D view…</p>}>
                <StepScene model={model} step={current} at={stroke.at} preset={look.preset} section={look.section} theme={theme} label={`Step ${step + 1} in the machine`} onLost={() => setLost(true)} />
              </Suspense>
            </DrawnOnFailure>
          )}
        </div>
        <StageSigns model={model} step={current} number={step + 1} />
      </div>
      <StrokeBar large={large} stroke={stroke} step={step} steps={model.steps.length} onStep={onStep} demanded={current.demanded} finished={current.finished} />
    </div>
  );
}

function DrawnStep({ model, step, at, number }: { readonly model: PlanModel; readonly step: StepModel; readonly at: number; readonly number: number }) {
  const picture = useMemo(() => stepPicture(model, step, strokeAt(at, step.demanded, step.finished)), [model, step, at]);
  return <StepDrawing picture={picture} label={`Step ${number}, section through the bend`} className="size-full p-2" />;
}

/** What is up, what is in front, what is at the gauge: in words and letters over the picture. */
function StageSigns({ model, step, number }: { readonly model: PlanModel; readonly step: StepModel; readonly number: number }) {
  const format = createSheetFormat(model.units);
  return (
    <div className="pointer-events-none absolute inset-x-0 top-0 flex items-start justify-between gap-4 p-3">
      <p className="flex items-center gap-2">
        <span className="num text-ink-soft">{number}</span>
        <span className="inline-flex h-9 items-center justify-center border-2 border-ink bg-sheet px-1.5 text-lg font-bold">{upSide(model, step)}</span>
        <span className="bg-sheet/80 px-1 leading-tight">up<br /><span className="text-sm text-ink-soft">{step.step.front} in front</span></span>
      </p>
      <p className="bg-sheet/80 px-1 text-right leading-tight">
        <span className="mr-1.5 inline-block h-2.5 w-5 bg-brick align-middle" aria-hidden />gauged edge<br />
        <span className="num text-sm text-ink-soft">X {format.gauge(step.gaugeX)}&ensp;R {format.gauge(step.gaugeR)}</span>
      </p>
    </div>
  );
}

function onKey(event: KeyboardEvent, stroke: ReturnType<typeof useStroke>, step: number, steps: number, onStep: (step: number) => void): void {
  const target = event.target as HTMLElement;
  const ownKeys = target.closest("button, [role=radio], input[type=text], select") !== null;
  if (event.key === " " && !ownKeys) stroke.toggle();
  else if (event.key === "ArrowLeft" && !ownKeys) stroke.scrub(stroke.at - 0.04);
  else if (event.key === "ArrowRight" && !ownKeys) stroke.scrub(stroke.at + 0.04);
  else if (event.key === "PageUp" && step > 0) onStep(step - 1);
  else if (event.key === "PageDown" && step + 1 < steps) onStep(step + 1);
  else return;
  event.preventDefault();
}
