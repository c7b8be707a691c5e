import { StepDrawing } from "@/components/preview/StepDrawing";
import type { SheetStep, SheetView } from "@/lib/sheet/sheetView";

/** The bend table: for every step its two drawings and all that is set. */
export function PaperSteps({ view }: { readonly view: SheetView }) {
  return (
    <section>
      <h2 className="caption mb-1">Bends in order</h2>
      <ol className="border-t border-ink">
        {view.steps.map((step) => <Step key={step.number} step={step} />)}
      </ol>
    </section>
  );
}

function Step({ step }: { readonly step: SheetStep }) {
  const cells = [
    ["Up", step.up], ["In front", step.front], ["To gauge", step.toGauge], ["Handling", step.handling],
    ["Punch", step.punch], ["Die", step.die], ["Station", step.station], ["Bend along the bed", step.bendZ],
  ] as const;
  const numbers = [
    ["Gauge X", step.gaugeX], ["R", step.gaugeR], ["Z", step.gaugeZ], ["Angle", step.angle], ["Included", step.includedAngle], ["Demanded", step.demandedAngle],
    ["Force", step.force], ["Depth", step.depth],
  ] as const;
  return (
    <li className="grid break-inside-avoid grid-cols-[2.5rem_minmax(0,1fr)] gap-x-3 border-b border-rule-strong py-2 sm:grid-cols-[2.5rem_11rem_11rem_minmax(0,1fr)] print:grid-cols-[2rem_3.6cm_3.6cm_minmax(0,1fr)]">
      <div className="text-center"><p className="num text-2xl font-semibold">{step.number}</p><p className="mt-1 border-2 border-ink text-center text-[0.65rem] leading-snug font-bold">{step.upSide}</p></div>
      <StepDrawing picture={step.picture} label={`Step ${step.number}, section`} className="h-32 w-full print:h-[2.3cm]" />
      <StepDrawing picture={step.above} label={`Step ${step.number}, from above`} className="h-32 w-full print:h-[2.3cm]" />
      <div>
        <p className="font-semibold">{step.bends}</p>
        <dl className="mt-0.5 flex flex-wrap gap-x-4 gap-y-0.5">
          {numbers.map(([label, value]) => <div key={label}><dt className="caption leading-none">{label}</dt><dd className="num font-semibold">{value}</dd></div>)}
        </dl>
        <dl className="mt-1 flex flex-wrap gap-x-4 gap-y-0.5 text-sm">
          {cells.map(([label, value]) => <div key={label} className="flex gap-1"><dt className="text-ink-soft">{label}</dt><dd>{value}</dd></div>)}
        </dl>
      </div>
    </li>
  );
}
