"use client";
import type { LengthUnit } from "@/bending/core/units";
import type { MaterialFacts } from "@/bending/handbook/material";
import { Choice } from "@/components/ui/Choice";
import { Select } from "@/components/ui/Select";
import { TextInput } from "@/components/ui/TextInput";
import type { InstrumentView } from "@/lib/schemas/bendTableViews";
import { convertTrialDraft } from "./convertTrialDraft";
import type { headProblems } from "./headProblems";
import type { AngleKind, TrialDraft } from "./trialDraft";

interface EntryHeadProps {
  readonly draft: TrialDraft;
  readonly update: (next: (old: TrialDraft) => TrialDraft) => void;
  readonly materials: readonly MaterialFacts[];
  readonly instruments: readonly InstrumentView[];
  readonly problems: ReturnType<typeof headProblems>;
}

const same = "same";

/** What holds for every line of the page: when, who, in which units, with which instruments. */
export function EntryHead({ draft, update, materials, instruments, problems }: EntryHeadProps) {
  const set = (change: Partial<TrialDraft>) => update((old) => ({ ...old, ...change }));
  const options = (angle: boolean) => instruments
    .filter(({ kind, withdrawn }) => withdrawn === null && (kind === "protractor") === angle)
    .map(({ id, name, uncertainty }) => ({ value: id, label: name, note: `± ${uncertainty < 0.1 ? Number(uncertainty.toPrecision(2)) : Number(uncertainty.toFixed(3))} ${angle ? "°" : "mm"}` }));
  return (
    <div className="mb-5 grid grid-cols-1 gap-x-4 gap-y-3 sm:grid-cols-2 lg:grid-cols-4 xl:grid-cols-[repeat(6,minmax(0,1fr))_auto_auto]">
      <TextInput id="trials-measuredOn" label="Measured on" type="date" value={draft.measuredOn} onChange={(event) => set({ measuredOn: event.target.value })} error={problems.measuredOn} />
      <TextInput id="trials-measuredBy" label="By" value={draft.measuredBy} onChange={(event) => set({ measuredBy: event.target.value })} error={problems.measuredBy} />
      <Select id="trials-lengthInstrument" label="Blank and flanges with" value={draft.lengthInstrument} onChange={(lengthInstrument) => set({ lengthInstrument })} options={options(false)} error={problems.lengthInstrument} placeholder="Choose" />
      <Select id="trials-thicknessInstrument" label="Thickness with" value={draft.thicknessInstrument === "" ? same : draft.thicknessInstrument} options={[{ value: same, label: "the same" }, ...options(false)]}
        onChange={(value) => set({ thicknessInstrument: value === same ? "" : value })} error={problems.thicknessInstrument} />
      <Select id="trials-angleInstrument" label="Angle with" value={draft.angleInstrument} onChange={(angleInstrument) => set({ angleInstrument })} options={options(true)} error={problems.angleInstrument} placeholder="Choose" />
      <Select id="trials-radiusInstrument" label="Inside radius with" value={draft.radiusInstrument} onChange={(radiusInstrument) => set({ radiusInstrument })} options={options(false)} error={problems.radiusInstrument} placeholder="Choose" />
      <Choice<LengthUnit> label="Lengths in" value={draft.units} onChange={(units) => update((old) => convertTrialDraft(old, { units, angles: old.angles }, materials))} options={[{ value: "mm", label: "mm" }, { value: "in", label: "inch" }]} />
      <Choice<AngleKind> label="Angles" value={draft.angles} onChange={(angles) => update((old) => convertTrialDraft(old, { units: old.units, angles }, materials))}
        options={[{ value: "turned", label: "turned", name: "turned through, 0 is flat" }, { value: "included", label: "included", name: "included, 180 is flat" }]} />
    </div>
  );
}
