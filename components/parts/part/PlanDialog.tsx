"use client";
import { useState, type FormEvent } from "react";
import { Button } from "@/components/ui/Button";
import { DialogBox } from "@/components/ui/DialogBox";
import { NumberInput } from "@/components/ui/NumberInput";
import { Notice } from "@/components/ui/Notice";
import { Select } from "@/components/ui/Select";
import { formatForce } from "@/lib/format/formatForce";
import { parseNumber } from "@/lib/format/parseNumber";
import { ApiProblem } from "@/lib/queries/apiProblem";
import { useMachines } from "@/lib/queries/machines";
import { useStartPlan } from "@/lib/queries/plans";
import type { PartDetail } from "@/lib/schemas/views";
import { StopNotice } from "../findings/StopNotice";
import { PlanProgress } from "./PlanProgress";

/** Asks for brake and batch, then follows the planner until there is a plan to look at. */
export function PlanDialog({ part, onClose }: { readonly part: PartDetail; readonly onClose: () => void }) {
  const machines = useMachines();
  const start = useStartPlan();
  const [chosen, setChosen] = useState("");
  const [batch, setBatch] = useState("20");
  const [batchProblem, setBatchProblem] = useState<string>();
  const machine = chosen === "" ? (machines.data?.[0]?.id ?? "") : chosen;
  const refused = start.error instanceof ApiProblem ? start.error : null;
  const submit = (event: FormEvent) => {
    event.preventDefault();
    const count = parseNumber(batch);
    if (!count.ok || !Number.isInteger(count.value) || count.value < 1) { setBatchProblem("Type how many parts are made in one go: a whole number from 1."); return; }
    setBatchProblem(undefined);
    start.mutate({ partId: part.id, revision: part.revision.revision, machineId: machine, batch: count.value });
  };
  if (start.data !== undefined) return <PlanProgress jobId={start.data.id} name={part.name} onAgain={() => start.reset()} onClose={onClose} />;
  return (
    <DialogBox open onOpenChange={onClose} title="Plan the bends" description={`Finds an order that clears the tools, from the tools in service, for ${part.name}, revision ${part.revision.revision}.`}
      actions={<><Button look="plain" onClick={onClose}>Cancel</Button><Button type="submit" form="plan-form" busy={start.isPending} disabled={machine === ""}>Find a plan</Button></>}>
      <form id="plan-form" noValidate onSubmit={submit} className="space-y-4">
        <StopNotice document={part.document} />
        {start.error === null ? null : <Notice tone="wrong" title="Planning did not start" live>{start.error.message}</Notice>}
        {machines.isError ? <Notice tone="wrong" title="The brakes could not be listed" live>{machines.error.message}</Notice> : null}
        <Select id="plan-machine" label="Brake" value={machine} onChange={setChosen} error={refused?.messageAt("machineId")} placeholder={machines.isPending ? "Loading…" : "No brake is set up"}
          options={(machines.data ?? []).map((one) => ({ value: one.id, label: one.name, note: `${one.bedLengthMm} mm, ${formatForce(one.maxForceKN)}` }))} />
        <NumberInput id="plan-batch" label="Batch" unit="parts" className="max-w-64" value={batch} onChange={(event) => setBatch(event.target.value)} error={batchProblem ?? refused?.messageAt("batch")}
          hint="Setup time is weighed against it." />
      </form>
    </DialogBox>
  );
}
