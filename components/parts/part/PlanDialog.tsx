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
import { planAlternatives, planTimeLimit } from "@/lib/schemas/planInputs";
import type { PartDetail } from "@/lib/schemas/views";
import { StopNotice } from "../findings/StopNotice";
import { PlanProgress } from "./PlanProgress";

/** The numbers of the form: what they may be, and what to say when they are not. */
const asked = {
  batch: { least: 1, most: 1_000_000, say: "Type how many parts are made in one go: a whole number from 1." },
  limitSeconds: { least: planTimeLimit.least, most: planTimeLimit.most, say: `Type whole seconds, ${planTimeLimit.least} to ${planTimeLimit.most}.` },
  alternatives: { least: 0, most: planAlternatives.most, say: `Type a whole number, 0 to ${planAlternatives.most}.` },
} as const;
type Field = keyof typeof asked;

function numberOf(field: Field, text: string): number | null {
  const { least, most } = asked[field];
  const read = parseNumber(text);
  return read.ok && Number.isInteger(read.value) && read.value >= least && read.value <= most ? read.value : null;
}

/** Asks for brake, batch and how long to search, then follows the planner until there is a plan to look at. */
export function PlanDialog({ part, onClose }: { readonly part: PartDetail; readonly onClose: () => void }) {
  const machines = useMachines();
  const start = useStartPlan();
  const [chosen, setChosen] = useState("");
  const [texts, setTexts] = useState<Record<Field, string>>({ batch: "20", limitSeconds: String(planTimeLimit.usual), alternatives: String(planAlternatives.usual) });
  const [otherBrakes, setOtherBrakes] = useState(false);
  const [tried, setTried] = useState(false);
  const machine = chosen === "" ? (machines.data?.[0]?.id ?? "") : chosen;
  const refused = start.error instanceof ApiProblem ? start.error : null;
  const submit = (event: FormEvent) => {
    event.preventDefault();
    setTried(true);
    const [batch, limitSeconds, alternatives] = [numberOf("batch", texts.batch), numberOf("limitSeconds", texts.limitSeconds), numberOf("alternatives", texts.alternatives)];
    if (batch === null || limitSeconds === null || alternatives === null) return;
    start.mutate({ partId: part.id, revision: part.revision.revision, machineId: machine, batch, limitSeconds, alternatives, otherBrakes });
  };
  const bind = (field: Field) => ({
    id: `plan-${field}`,
    value: texts[field],
    onChange: (event: { readonly target: { readonly value: string } }) => setTexts({ ...texts, [field]: event.target.value }),
    error: (tried && numberOf(field, texts[field]) === null ? asked[field].say : undefined) ?? refused?.messageAt(field),
  });
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
        <div className="grid gap-4 sm:grid-cols-3">
          <NumberInput {...bind("batch")} label="Batch" unit="parts" hint="Setup time is weighed against it." />
          <NumberInput {...bind("limitSeconds")} label="Search for at most" unit="s" hint="Ends sooner when proven best." />
          <NumberInput {...bind("alternatives")} label="Other plans" hint="Different ones, to compare." />
        </div>
        <label htmlFor="plan-other" className="flex items-start gap-2.5">
          <input id="plan-other" type="checkbox" className="mt-1 size-4.5 accent-(--accent)" checked={otherBrakes} onChange={(event) => setOtherBrakes(event.target.checked)} />
          <span>Tools may be fetched from other brakes<span className="block text-sm text-ink-soft">If not, pieces that stand at another brake are left there.</span></span>
        </label>
      </form>
    </DialogBox>
  );
}
