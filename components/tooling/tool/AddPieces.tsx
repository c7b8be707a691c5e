"use client";
import { useState, type FormEvent } from "react";
import { Button } from "@/components/ui/Button";
import { DialogBox } from "@/components/ui/DialogBox";
import { Notice } from "@/components/ui/Notice";
import { NumberInput } from "@/components/ui/NumberInput";
import { Select } from "@/components/ui/Select";
import { TextInput } from "@/components/ui/TextInput";
import { useToast } from "@/components/ui/ToastProvider";
import { parseLength } from "@/lib/format/parseLength";
import { parseNumber } from "@/lib/format/parseNumber";
import { ApiProblem } from "@/lib/queries/apiProblem";
import { useAddPieces } from "@/lib/queries/tools";

const horns = [{ value: "none", label: "plain" }, { value: "left", label: "left end cut away" }, { value: "right", label: "right end cut away" }, { value: "both", label: "both ends cut away" }] as const;

export function AddPieces({ code, onClose }: { readonly code: string; readonly onClose: () => void }) {
  const toast = useToast();
  const add = useAddPieces(code);
  const [values, setValues] = useState({ length: "", count: "1", horn: "none", rack: "" });
  const [wrong, setWrong] = useState<{ readonly length?: string; readonly count?: string }>({});
  const set = (change: Partial<typeof values>) => setValues((old) => ({ ...old, ...change }));
  const refused = add.error instanceof ApiProblem ? add.error : null;
  const submit = (event: FormEvent) => {
    event.preventDefault();
    const length = parseLength(values.length, "mm");
    const count = parseNumber(values.count);
    const bad = {
      ...(length.ok ? (length.value > 0 ? {} : { length: "A piece must be longer than 0." }) : { length: length.error }),
      ...(count.ok && Number.isInteger(count.value) && count.value >= 1 && count.value <= 200 ? {} : { count: "Type a whole number from 1 to 200." }),
    };
    setWrong(bad);
    if (!length.ok || !count.ok || Object.keys(bad).length > 0) return;
    const horn = horns.find((one) => one.value === values.horn)?.value ?? "none";
    add.mutate({ units: "mm", pieces: [{ length: length.value, count: count.value, rack: values.rack.trim(), horn: horn === "none" ? null : horn }] }, {
      onSuccess: () => { toast("good", count.value === 1 ? "Piece added" : `${count.value} pieces added`, code); onClose(); },
    });
  };
  return (
    <DialogBox open onOpenChange={onClose} title={`Add pieces of ${code}`} description="Each piece gets a mark of its own."
      actions={<><Button look="plain" onClick={onClose}>Cancel</Button><Button type="submit" form="add-pieces" busy={add.isPending}>Add</Button></>}>
      <form id="add-pieces" noValidate onSubmit={submit} className="grid grid-cols-2 gap-4">
        {add.error === null ? null : <div className="col-span-2"><Notice tone="wrong" title="Nothing was added" live>{add.error.message}</Notice></div>}
        <NumberInput id="piece-length" label="Length" unit="mm" value={values.length} onChange={(event) => set({ length: event.target.value })} error={wrong.length ?? refused?.messageAt("pieces[0].length")} />
        <NumberInput id="piece-count" label="How many alike" value={values.count} onChange={(event) => set({ count: event.target.value })} error={wrong.count ?? refused?.messageAt("pieces[0].count")} />
        <Select id="piece-horn" label="Ends" value={values.horn} onChange={(horn) => set({ horn })} options={horns} />
        <TextInput id="piece-rack" label="Rack place" value={values.rack} onChange={(event) => set({ rack: event.target.value })} error={refused?.messageAt("pieces[0].rack")} />
      </form>
    </DialogBox>
  );
}
