"use client";
import type { ReactNode } from "react";
import type { FieldProblem } from "@/bending/core/problem";
import { materialGroups, straightLengthGroups, materialRules, type MaterialField } from "@/bending/handbook/material";
import { oneOf } from "@/components/ui/oneOf";
import { NumberInput } from "@/components/ui/NumberInput";
import { Panel } from "@/components/ui/Panel";
import { Select } from "@/components/ui/Select";
import { TextInput } from "@/components/ui/TextInput";
import { asSentence } from "@/lib/format/asSentence";
import { springbackRows } from "@/lib/schemas/materialInputs";
import { fieldWords, ruleWords } from "../materialWords";
import { changeDraft } from "./changeDraft";
import type { MaterialDraft } from "./materialDraft";
import { OriginFields } from "./OriginFields";
import { RadiiEditor } from "./RadiiEditor";

interface MaterialFieldsProps {
  readonly draft: MaterialDraft;
  /** What the typing began with: a value that is another now is no longer from where it was. */
  readonly compared: MaterialDraft;
  readonly isNew: boolean;
  readonly onChange: (draft: MaterialDraft) => void;
  readonly problems: readonly FieldProblem[];
}

/** Every value of a material beside where it is from. */
export function MaterialFields({ draft, compared, isNew, onChange, problems }: MaterialFieldsProps) {
  const at = (path: string) => { const found = problems.find((problem) => problem.path === path); return found === undefined ? undefined : asSentence(found.message); };
  const tell = (change: Partial<MaterialDraft>) => onChange({ ...draft, ...change });
  const value = (field: MaterialField, change: Partial<MaterialDraft>) => onChange(changeDraft(draft, field, change, compared));
  const number = (field: MaterialField, key: "tensileLow" | "tensileHigh" | "yield" | "modulus" | "density" | "naturalRadiusRatio" | "defaultRadiusPerThickness" | "k", label: string, unit?: string, path: string = field) => (
    <NumberInput id={`material-${path}`} label={label} labelHidden={label === fieldWords[field]} value={draft[key]} error={at(path)} onChange={(event) => value(field, { [key]: event.target.value })} {...(unit === undefined ? {} : { unit })} />
  );
  const row = (field: MaterialField, controls: ReactNode) => (
    <div key={field} className="grid items-start gap-x-6 gap-y-2 border-b border-rule py-2.5 lg:grid-cols-[13rem_minmax(0,18rem)_minmax(0,1fr)]">
      <p className="pt-2 font-medium text-ink-soft">{fieldWords[field]}</p>
      <div>{controls}</div>
      <OriginFields field={field} origin={draft.origins[field]} error={at(`origins.${field}`)} onChange={(origin) => tell({ origins: { ...draft.origins, [field]: origin } })} />
    </div>
  );
  return (
    <div className="space-y-8">
      <Panel title="Name">
        <div className="grid grid-cols-1 gap-4 sm:grid-cols-2 lg:grid-cols-4">
          <TextInput id="material-id" label="Short name" value={draft.id} disabled={!isNew} maxLength={60} error={at("id")} hint={isNew ? "As parts are made of it, e.g. S235" : "Stays: parts are made of it"} onChange={(event) => tell({ id: event.target.value })} />
          <TextInput id="material-name" label="Name" value={draft.name} maxLength={120} error={at("name")} onChange={(event) => tell({ name: event.target.value })} />
          <TextInput id="material-designation" label="Designation in full" value={draft.designation} maxLength={120} error={at("designation")} hint="As the standard writes it, e.g. S235JR" onChange={(event) => tell({ designation: event.target.value })} />
          <TextInput id="material-standard" label="Standard" value={draft.standard} maxLength={120} error={at("standard")} hint="E.g. EN 10025-2" onChange={(event) => tell({ standard: event.target.value })} />
          <Select id="material-group" label="Group" value={draft.group} options={materialGroups.map((group) => ({ value: group, label: group }))} onChange={(next) => tell({ group: oneOf(materialGroups, next, draft.group) })} />
        </div>
      </Panel>
      <Panel title="Values, and where each is from">
        {row("tensile", <div className="grid grid-cols-2 gap-2">{number("tensile", "tensileLow", "Lowest", "MPa", "tensile[0]")}{number("tensile", "tensileHigh", "Highest", "MPa", "tensile[1]")}</div>)}
        {row("yield", number("yield", "yield", fieldWords.yield, "MPa"))}
        {row("modulus", number("modulus", "modulus", fieldWords.modulus, "GPa"))}
        {row("density", number("density", "density", fieldWords.density, "kg/m³"))}
        {row("allowance", (
          <div className="space-y-2">
            <Select id="material-allowance" label={fieldWords.allowance} labelHidden value={draft.rule} options={materialRules.map((rule) => ({ value: rule, label: ruleWords[rule] }))} onChange={(next) => value("allowance", { rule: oneOf(materialRules, next, draft.rule) })} />
            {draft.rule === "k" ? number("allowance", "k", "K", undefined, "allowance.k") : null}
          </div>
        ))}
        {row("straightLengthGroup", <Select id="material-straightLengthGroup" label={fieldWords.straightLengthGroup} labelHidden value={draft.straightLengthGroup} options={straightLengthGroups.map((group) => ({ value: group, label: group }))} onChange={(next) => value("straightLengthGroup", { straightLengthGroup: oneOf(straightLengthGroups, next, draft.straightLengthGroup) })} />)}
        {row("naturalRadiusRatio", number("naturalRadiusRatio", "naturalRadiusRatio", fieldWords.naturalRadiusRatio))}
        {row("defaultRadiusPerThickness", number("defaultRadiusPerThickness", "defaultRadiusPerThickness", fieldWords.defaultRadiusPerThickness))}
        {row("springbackRow", <Select id="material-springbackRow" label={fieldWords.springbackRow} labelHidden value={draft.springbackRow} options={[{ value: "none", label: "Yield and modulus (elastic recovery)" }, ...springbackRows.map((name) => ({ value: name, label: `kR table, ${name}` }))]} onChange={(next) => value("springbackRow", { springbackRow: oneOf(["none", ...springbackRows] as const, next, draft.springbackRow) })} />)}
        <div className="border-b border-rule py-2.5">
          <div className="mb-3 grid items-start gap-x-6 gap-y-2 lg:grid-cols-[13rem_minmax(0,18rem)_minmax(0,1fr)]">
            <p className="pt-2 font-medium text-ink-soft lg:col-span-2">{fieldWords.minimumRadii}</p>
            <OriginFields field="minimumRadii" origin={draft.origins.minimumRadii} error={at("origins.minimumRadii")} onChange={(origin) => tell({ origins: { ...draft.origins, minimumRadii: origin } })} />
          </div>
          <RadiiEditor draft={draft} problems={problems} onChange={(change) => value("minimumRadii", change)} />
        </div>
      </Panel>
    </div>
  );
}
