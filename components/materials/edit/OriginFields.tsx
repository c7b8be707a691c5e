"use client";
import { originKinds, type MaterialField, type Origin } from "@/bending/handbook/material";
import { Select } from "@/components/ui/Select";
import { TextInput } from "@/components/ui/TextInput";
import { fieldWords, originWords } from "../materialWords";

interface OriginFieldsProps {
  readonly field: MaterialField;
  readonly origin: Origin;
  readonly onChange: (origin: Origin) => void;
  readonly error: string | undefined;
}

/** Where a value is from: its kind and in words. */
export function OriginFields({ field, origin, onChange, error }: OriginFieldsProps) {
  const words = fieldWords[field];
  return (
    <div className="grid grid-cols-[9.5rem_minmax(0,1fr)] gap-2">
      <Select id={`material-origin-kind-${field}`} label={`${words}: kind of source`} labelHidden value={origin.kind} options={originKinds.map((value) => ({ value, label: originWords[value] }))}
        onChange={(value) => { const kind = originKinds.find((one) => one === value); if (kind !== undefined) onChange({ ...origin, kind }); }} />
      <TextInput id={`material-origins.${field}`} label={`${words}: source`} labelHidden value={origin.text} maxLength={300} placeholder={origin.kind === "shop" ? "Certificate, own trial…" : "Standard, table, page…"} error={error}
        onChange={(event) => onChange({ ...origin, text: event.target.value })} />
    </div>
  );
}
