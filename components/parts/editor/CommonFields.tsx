"use client";
import type { MaterialFacts } from "@/bending/handbook/material";
import type { LengthUnit } from "@/bending/core/units";
import type { DimensionKind } from "@/bending/part/partDocument";
import { Choice } from "@/components/ui/Choice";
import { Select } from "@/components/ui/Select";
import type { MaterialView } from "@/lib/schemas/materialViews";
import { convertDraft } from "../draft/convertDraft";
import type { PartDraft } from "../draft/partDraft";
import { CutFields } from "./CutFields";
import { useEditor } from "./editorContext";
import { fieldId } from "./fieldId";
import { PathField } from "./PathField";

const rules: readonly { readonly value: PartDraft["rule"]; readonly label: string }[] = [
  { value: "default", label: "As usual: the shop’s measured value, else the material’s rule" },
  { value: "shop", label: "Shop’s measured values first" },
  { value: "din6935", label: "DIN 6935" },
  { value: "machinery", label: "Straight length by material group" },
  { value: "faa", label: "Aircraft repair handbook formula" },
  { value: "k", label: "The K-factor given here" },
];

const grains: readonly { readonly value: PartDraft["grain"]; readonly label: string }[] = [
  { value: "absent", label: "not known" }, { value: "x", label: "along x of the flat" }, { value: "y", label: "along y of the flat" }, { value: "angle", label: "at an angle" },
];

/** A withdrawn material is offered no more, but stays with a part that is of it. */
type Offered = MaterialFacts & Partial<Pick<MaterialView, "withdrawn">>;

/** Material, thickness, radius, and how lengths are measured and unfolded. */
export function CommonFields({ materials }: { readonly materials: readonly Offered[] }) {
  const { draft, update, problemAt } = useEditor();
  const set = (change: Partial<PartDraft>) => update((old) => ({ ...old, ...change }));
  return (
    <div className="grid grid-cols-2 gap-x-4 gap-y-3">
      <Select id={fieldId("material")} label="Material" value={draft.material} onChange={(material) => set({ material })} error={problemAt("material")} className="col-span-2"
        placeholder="Choose a material" options={materials.filter(({ id, withdrawn }) => (withdrawn ?? null) === null || id === draft.material).map(({ id, name }) => ({ value: id, label: name, note: name.includes(id) ? undefined : id }))} />
      <PathField path="thickness" label="Thickness" value={draft.thickness} onChange={(thickness) => set({ thickness })} hint="Also 16 ga, 1/8 in" />
      <div className="flex flex-col items-start gap-3">
        <Choice<LengthUnit> label="Lengths in" value={draft.units} onChange={(units) => update((old) => convertDraft(old, units))}
          options={[{ value: "mm", label: "mm" }, { value: "in", label: "inch" }]} />
      </div>
      <Choice label="Inside radius" value={draft.radiusFrom} onChange={(radiusFrom) => set({ radiusFrom })}
        options={[{ value: "die", label: "From the die" }, { value: "typed", label: "Given" }]} />
      {draft.radiusFrom === "typed"
        ? <PathField path="insideRadius" label="Radius" value={draft.insideRadius} onChange={(insideRadius) => set({ insideRadius })} />
        : <p className="self-end pb-2 text-sm text-ink-faint">Until a die is chosen, the material’s usual radius is taken.</p>}
      <Choice<DimensionKind> label="Lengths are measured" value={draft.dimension} onChange={(dimension) => set({ dimension })}
        options={[{ value: "outside", label: "outside" }, { value: "inside", label: "inside" }, { value: "tangent", label: "tangent" }]} />
      <PathField path="kFactor" label="K-factor (only to override)" kind="number" value={draft.kFactor} onChange={(kFactor) => set({ kFactor })} placeholder="from the rule" />
      <Select id={fieldId("rule")} label="Bend allowance by" value={draft.rule} options={rules} error={problemAt("rule")} className="col-span-2"
        onChange={(value) => { const rule = rules.find((one) => one.value === value); if (rule !== undefined) set({ rule: rule.value }); }} />
      {draft.shape !== "base" ? null : <CutFields at="" relief={draft.relief} corner={draft.corner} otherwise={{ relief: "none", corner: "open" }} onChange={set} />}
      <Select id={fieldId("grain")} label="Rolling direction (grain)" value={draft.grain} options={grains} error={problemAt("grain")}
        onChange={(value) => set({ grain: grains.find((one) => one.value === value)?.value ?? "absent" })} />
      {draft.grain === "angle" ? <PathField path="grain" label="From x, counter-clockwise" kind="angle" value={draft.grainAngle} onChange={(grainAngle) => set({ grainAngle })} /> : null}
      <PathField path="toleranceAngle" label="Angle tolerance ±" kind="angle" value={draft.toleranceAngle} onChange={(toleranceAngle) => set({ toleranceAngle })} placeholder="general" />
      <PathField path="toleranceLength" label="Length tolerance ±" value={draft.toleranceLength} onChange={(toleranceLength) => set({ toleranceLength })} placeholder="general" />
    </div>
  );
}
