"use client";
import { useMemo, useState } from "react";
import type { PartModel } from "@/bending/part/partModel";
import type { FailedStroke, PlanFailure } from "@/bending/plan/planFailure";
import { FailedStage } from "@/components/preview/FailedStage";
import { StepStage } from "@/components/preview/StepStage";
import type { FailedStepFacts } from "@/lib/sheet/failedStep";
import { planModel } from "@/lib/sheet/planModel";
import type { PlanDetail, PlanShopView } from "@/lib/schemas/views";
import type { OrderCheck } from "./useOrderCheck";

interface OwnOrderStageProps {
  readonly detail: PlanDetail;
  readonly task: PlanShopView["task"];
  readonly part: PartModel | null;
  readonly check: OrderCheck;
}

/** The order in the machine once it is worked out; of one that fails, the moment at which it does. */
export function OwnOrderStage({ detail, task, part, check }: OwnOrderStageProps) {
  const [step, setStep] = useState(0);
  const { plan, failure } = check;
  const model = useMemo(() => (plan === null || plan.steps.length === 0 ? null : planModel({ plan, document: detail.document, material: task.material, machine: task.machine, tools: task.tools })), [plan, detail.document, task]);
  const failed = useMemo(() => (failure && part ? failedFacts(failure, part, task, detail) : null), [failure, part, task, detail]);
  if (failed) return <FailedStage facts={failed} />;
  if (model === null) return null;
  return <StepStage model={model} step={Math.min(step, model.steps.length - 1)} onStep={setStep} className="flex h-[26rem] flex-col border border-rule-strong bg-sheet" />;
}

/** The first thing in the way that has a place to show. */
function failedFacts({ done, strokes }: PlanFailure, part: PartModel, { machine, tools }: PlanShopView["task"], { plan }: PlanDetail): FailedStepFacts | null {
  const stroke: FailedStroke | undefined = strokes[0];
  const reason = stroke?.reasons.find(({ evidence, pairs, fronts }) => evidence !== undefined && pairs.length > 0 && fronts.length > 0);
  const [pair, front] = [reason?.pairs[0], reason?.fronts[0]];
  if (stroke === undefined || reason === undefined || pair === undefined || front === undefined) return null;
  return { part, machine, tools, units: plan.units, done: done.flatMap((entry) => entry.split("+")), bends: stroke.bends, front, punch: pair.punch, die: pair.die, reason };
}
