"use client";
import { useMemo, useState } from "react";
import { unitName } from "@/lib/format/unitName";
import { BedMapDrawing } from "@/components/preview/BedMapDrawing";
import { StepStage } from "@/components/preview/StepStage";
import { Notice } from "@/components/ui/Notice";
import { Panel } from "@/components/ui/Panel";
import { asSentence } from "@/lib/format/asSentence";
import { bedMap } from "@/lib/sheet/bedMap";
import { planModel } from "@/lib/sheet/planModel";
import type { PlanDetail } from "@/lib/schemas/views";
import { OffCentre } from "./OffCentre";
import { OrderTable } from "./OrderTable";

/** A plan that works: the order beside the machine, the bed, the flat, what to mind. */
export function PlanWork({ detail }: { readonly detail: PlanDetail }) {
  const [step, setStep] = useState(0);
  const { plan, document, material, machineModel: machine, tools } = detail;
  const model = useMemo(() => planModel({ plan, document, material, machine, tools }), [plan, document, material, machine, tools]);
  const map = useMemo(() => bedMap(model), [model]);
  return (
    <div className="space-y-8">
      <div className="grid gap-6 xl:grid-cols-[minmax(0,1fr)_minmax(26rem,38%)]">
        <Panel title="Order" aside={`Lengths in ${unitName(plan.units)}; choose a row to see the step`}>
          <OrderTable model={model} selected={step} onSelect={setStep} />
        </Panel>
        <StepStage model={model} step={step} onStep={setStep} className="flex h-[30rem] flex-col border border-rule-strong bg-sheet xl:sticky xl:top-4" />
      </div>
      {plan.cautions.length === 0 ? null : (
        <div className="space-y-2">
          {plan.cautions.map((caution, index) => <Notice key={index} tone="caution" title={asSentence(caution.message, [...caution.bends, ...caution.tools])}>{[...caution.bends, ...caution.tools].join(", ") || undefined}</Notice>)}
        </div>
      )}
      <Panel title="Bed" aside={`${map.length} between the ends, seen by the operator`}>
        <BedMapDrawing map={map} className="w-full border border-rule bg-sheet" />
        <details className="mt-2">
          <summary className="text-sm text-accent-ink">Closer: only the run of the bed that carries tools</summary>
          <BedMapDrawing map={map} close className="mt-2 w-full border border-rule bg-sheet" />
        </details>
        <OffCentre plan={plan} />
      </Panel>
    </div>
  );
}
