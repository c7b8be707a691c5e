"use client";
import { useState, type FormEvent } from "react";
import { Button } from "@/components/ui/Button";
import { DialogBox } from "@/components/ui/DialogBox";
import { Notice } from "@/components/ui/Notice";
import { NumberInput } from "@/components/ui/NumberInput";
import { Select } from "@/components/ui/Select";
import { TextInput } from "@/components/ui/TextInput";
import { useToast } from "@/components/ui/ToastProvider";
import { asSentence } from "@/lib/format/asSentence";
import { ApiProblem } from "@/lib/queries/apiProblem";
import { useCreateInstrument } from "@/lib/queries/bendTable";
import { instrumentKinds, type InstrumentKind } from "@/lib/schemas/bendTableInputs";
import { readInstrument } from "./readInstrument";

export function NewInstrument({ onClose }: { readonly onClose: () => void }) {
  const toast = useToast();
  const create = useCreateInstrument();
  const [values, setValues] = useState({ name: "", kind: "calliper" as InstrumentKind, resolution: "0.01", uncertainty: "", note: "" });
  const [tried, setTried] = useState(false);
  const set = (change: Partial<typeof values>) => { if (create.isError) create.reset(); setValues((old) => ({ ...old, ...change })); };
  const read = readInstrument(values);
  const refused = create.error instanceof ApiProblem ? create.error : null;
  const at = (path: keyof typeof values) => {
    const own = tried && !read.ok ? read.error[path] : undefined;
    const said = refused?.messageAt(path);
    return own ?? (said === undefined ? undefined : asSentence(said));
  };
  const unit = values.kind === "protractor" ? "°" : "mm";
  const submit = (event: FormEvent) => {
    event.preventDefault();
    setTried(true);
    if (!read.ok) { document.getElementById(`instrument-${Object.keys(read.error)[0] ?? "name"}`)?.focus(); return; }
    create.mutate(read.value, { onSuccess: ({ name }) => { toast("good", "Instrument added", name); onClose(); } });
  };
  return (
    <DialogBox open onOpenChange={onClose} title="Add an instrument" description="The limit of error stands on its calibration certificate or in its standard; with neither, on the maker's sheet."
      actions={<><Button look="plain" onClick={onClose}>Cancel</Button><Button type="submit" form="new-instrument" busy={create.isPending}>Add</Button></>}>
      <form id="new-instrument" noValidate onSubmit={submit} className="grid grid-cols-2 gap-4">
        {create.error === null ? null : <div className="col-span-2"><Notice tone="wrong" title="Nothing was added" live>{create.error.message}</Notice></div>}
        <TextInput id="instrument-name" label="Name" value={values.name} onChange={(event) => set({ name: event.target.value })} error={at("name")} hint="As it is marked, so that it is found again" />
        <Select id="instrument-kind" label="Kind" value={values.kind} onChange={(value) => set({ kind: instrumentKinds.find((kind) => kind === value) ?? "calliper" })} options={instrumentKinds.map((kind) => ({ value: kind, label: kind }))} />
        <NumberInput id="instrument-resolution" label="Smallest step" unit={unit} value={values.resolution} onChange={(event) => set({ resolution: event.target.value })} error={at("resolution")} />
        <NumberInput id="instrument-uncertainty" label="Limit of error ±" unit={unit} value={values.uncertainty} onChange={(event) => set({ uncertainty: event.target.value })} error={at("uncertainty")} />
        <TextInput id="instrument-note" label="Where the limit comes from" className="col-span-2" value={values.note} onChange={(event) => set({ note: event.target.value })} error={at("note")} />
      </form>
    </DialogBox>
  );
}
