"use client";
import { useMemo, useState } from "react";
import { StepStage } from "@/components/preview/StepStage";
import { planModel } from "@/lib/sheet/planModel";
import type { PlanDetail, PlanShopView } from "@/lib/schemas/views";
import type { TriedOrder } from "./orderMessages";
import type { OrderCheck } from "./useOrderCheck";

interface OwnOrderStageProps {
  readonly detail: PlanDetail;
  readonly task: PlanShopView["task"];
  readonly tried: TriedOrder;
  readonly check: OrderCheck;
}

/** The order in the machine, once it is worked out. */
export function OwnOrderStage({ detail, task, check }: OwnOrderStageProps) {
  const [step, setStep] = useState(0);
  const { plan } = check;
  const model = useMemo(() => (plan === null || plan.steps.length === 0 ? null : planModel({ plan, document: detail.document, material: task.material, machine: task.machine, tools: task.tools })), [plan, detail.document, task]);
  if (model === null) return null;
  return <StepStage model={model} step={Math.min(step, model.steps.length - 1)} onStep={setStep} className="flex h-[26rem] flex-col border border-rule-strong bg-sheet" />;
}
