"use client";
import type { MaterialFacts } from "@/bending/handbook/material";
import { NumberInput } from "@/components/ui/NumberInput";
import { Select } from "@/components/ui/Select";
import { TextInput } from "@/components/ui/TextInput";
import type { ImportForm } from "./importForm";

const rules: readonly { readonly value: ImportForm["rule"]; readonly label: string }[] = [
  { value: "default", label: "As usual: the shop’s measured value, else the material’s rule" },
  { value: "shop", label: "Shop’s measured values first" },
  { value: "din6935", label: "DIN 6935" },
  { value: "machinery", label: "Straight length by material group" },
  { value: "faa", label: "Aircraft repair handbook formula" },
];

interface ImportFieldsProps {
  readonly form: ImportForm;
  readonly materials: readonly MaterialFacts[];
  readonly problemAt: (path: string) => string | undefined;
  readonly numberProblem: string | undefined;
  readonly onChange: (change: Partial<ImportForm>) => void;
}

/** Name, number, material, thickness and the rule to unfold by. */
export function ImportFields({ form, materials, problemAt, numberProblem, onChange }: ImportFieldsProps) {
  const rule = (value: string) => rules.find((one) => one.value === value)?.value ?? "default";
  return (
    <div className="grid grid-cols-1 gap-x-4 gap-y-3 sm:grid-cols-[minmax(0,2fr)_minmax(0,1fr)]">
      <TextInput id="import-name" label="Name" value={form.name} onChange={(event) => onChange({ name: event.target.value })} error={problemAt("name")} />
      <TextInput id="import-number" label="Number" placeholder="given when saved" value={form.number} onChange={(event) => onChange({ number: event.target.value })}
        error={numberProblem?.includes("number") === true ? numberProblem : undefined} />
      <Select id="import-material" label="Material" value={form.material} onChange={(material) => onChange({ material })}
        options={materials.map(({ id, name }) => ({ value: id, label: name, note: name.includes(id) ? undefined : id }))} />
      <NumberInput id="import-thickness" label="Thickness" unit="mm" value={form.thickness} onChange={(event) => onChange({ thickness: event.target.value })} error={problemAt("thickness")} />
      <Select id="import-rule" label="Bend allowance by" className="sm:col-span-2" value={form.rule} onChange={(value) => onChange({ rule: rule(value) })} options={rules}
        hint="The flat is unfolded by this shop’s rule, not by what the file’s author assumed." />
    </div>
  );
}
