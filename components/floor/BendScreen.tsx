"use client";
import { useMemo, useState } from "react";
import { StepDrawing } from "@/components/preview/StepDrawing";
import { StepStage } from "@/components/preview/StepStage";
import { planModel } from "@/lib/sheet/planModel";
import type { SheetStep, SheetView } from "@/lib/sheet/sheetView";

interface BendScreenProps { readonly view: SheetView; readonly step: SheetStep; readonly onStep: (index: number) => void }

/** One bend: the pictures large, the numbers larger. */
export function BendScreen({ view, step, onStep }: BendScreenProps) {
  const [solid, setSolid] = useState(false);
  return (
    <div className="grid min-h-0 grow gap-3 p-3 lg:grid-cols-[minmax(0,1fr)_25rem]">
      <div className="flex min-h-96 flex-col gap-2">
        {step.handling === "as it lies" ? null : <p className="border-2 border-amber bg-amber-wash px-4 py-1 text-center text-4xl font-bold text-amber-ink uppercase">{step.handling}</p>}
        {solid ? <SolidStep view={view} step={step} onStep={onStep} /> : (
          <div className="grid min-h-0 grow grid-cols-2 gap-2">
            <Picture title="From above"><StepDrawing picture={step.above} label={`Bend ${step.number} from above`} className="absolute inset-0 size-full p-2" /></Picture>
            <Picture title="Seen from the right"><StepDrawing picture={step.picture} label={`Bend ${step.number}, section`} className="absolute inset-0 size-full p-2" /></Picture>
          </div>
        )}
        <div className="grid grid-cols-2 gap-2">
          <Switch on={!solid} onClick={() => setSolid(false)}>Drawings</Switch>
          <Switch on={solid} onClick={() => setSolid(true)}>3D</Switch>
        </div>
      </div>
      <BendNumbers step={step} />
    </div>
  );
}

function SolidStep({ view, step, onStep }: BendScreenProps) {
  const model = useMemo(() => planModel(view.source), [view.source]);
  return <StepStage model={model} step={step.number - 1} onStep={onStep} theme="dark" large className="flex min-h-0 grow flex-col border-2 border-rule-strong bg-sheet" />;
}

function Picture({ title, children }: { readonly title: string; readonly children: React.ReactNode }) {
  return <figure className="relative flex min-h-0 flex-col border-2 border-rule-strong bg-sheet"><figcaption className="px-3 py-1 text-lg text-ink-soft">{title}</figcaption><div className="relative grow">{children}</div></figure>;
}

function Switch({ on, onClick, children }: { readonly on: boolean; readonly onClick: () => void; readonly children: React.ReactNode }) {
  return <button type="button" aria-pressed={on} onClick={onClick} className={`min-h-16 border-2 text-2xl font-medium ${on ? "border-ink bg-ink text-paper" : "border-rule-strong bg-sheet"}`}>{children}</button>;
}

function BendNumbers({ step }: { readonly step: SheetStep }) {
  return (
    <div className="flex flex-col border-2 border-rule-strong bg-sheet">
      <div className="flex items-center gap-4 border-b-2 border-rule-strong p-3">
        <span className="flex h-24 shrink-0 items-center justify-center border-4 border-ink px-3 text-4xl font-bold">{step.upSide}</span>
        <p className="min-w-0 text-2xl leading-tight"><span className="font-semibold">{step.up} up</span><br /><span className="text-ink-soft">in front</span> <span className="font-semibold break-words">{step.front}</span></p>
      </div>
      <div className="border-b-2 border-rule-strong px-3 pt-2 pb-3">
        <p className="text-xl text-ink-soft">Gauge X</p>
        <p className="num text-[5rem] leading-none font-semibold tracking-tight">{step.gaugeX}</p>
        <p className="mt-2 flex justify-between gap-3 text-2xl"><span className="text-ink-soft">R</span><span className="num text-3xl font-semibold">{step.gaugeR}</span><span className="text-ink-soft">Z</span><span className="num text-3xl font-semibold whitespace-nowrap">{step.fingers.map((finger) => finger.z).join("  ") || "none"}</span></p>
        <p className="mt-2 text-xl"><span className="mr-2 inline-block h-3 w-8 bg-brick" aria-hidden />{step.toGauge}</p>
      </div>
      <div className="border-b-2 border-rule-strong px-3 py-2">
        <p className="text-xl text-ink-soft">Angle of the bend</p>
        <p className="num text-[4rem] leading-none font-semibold">{step.angle}</p>
        <p className="mt-1 text-2xl"><span className="text-ink-soft">demanded</span> <span className="num font-semibold">{step.demandedAngle}</span>&ensp;<span className="text-ink-soft">included</span> <span className="num font-semibold">{step.includedAngle}</span></p>
      </div>
      <p className="grow px-3 py-2 text-xl"><span className="text-ink-soft">Station</span> <span className="text-3xl font-bold">{step.station}</span>&ensp;<span className="num">{step.punch}</span> / <span className="num">{step.die}</span>&ensp;<span className="num text-ink-soft">{step.force}</span></p>
    </div>
  );
}
