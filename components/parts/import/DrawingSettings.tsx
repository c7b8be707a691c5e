"use client";
import { drawingUnitName, mmPerDrawingUnit, type DrawingUnit } from "@/bending/exchange/dxf/import/drawingUnit";
import { mmPer } from "@/bending/core/units";
import { Button } from "@/components/ui/Button";
import { Choice } from "@/components/ui/Choice";
import { Notice } from "@/components/ui/Notice";
import { NumberInput } from "@/components/ui/NumberInput";
import { Panel } from "@/components/ui/Panel";
import { Select } from "@/components/ui/Select";
import { formatNumber } from "@/lib/format/formatNumber";
import { convertDraft } from "../draft/convertDraft";
import type { DrawingFacts } from "./drawingMessages";
import { gapOf } from "./importChoicesOf";
import type { ImportForm } from "./importForm";
import { LineGroupTable } from "./LineGroupTable";
import type { FoundDrawing } from "./useDrawing";

interface DrawingSettingsProps {
  readonly facts: DrawingFacts;
  readonly found: FoundDrawing;
  readonly form: ImportForm;
  readonly onForm: (form: ImportForm) => void;
}

const SHOWN_CONTOURS = 12;

/** How the drawing is read: its unit, what each sort of line is, how large a gap is closed. */
export function DrawingSettings({ facts, found, form, onForm }: DrawingSettingsProps) {
  const { units, groups } = facts;
  const { flat } = found;
  const set = (change: Partial<ImportForm>) => onForm({ ...form, ...change });
  const unitNames = [...new Set<DrawingUnit>(["mm", "in", ...(units.header === null ? [] : [units.header]), form.unit])];
  const say = (unit: DrawingUnit) => {
    const into = unit === "in" || unit === "ft" ? "in" : "mm";
    onForm({ ...form, unit, unitSaid: true, draft: convertDraft(form.draft, into) });
  };
  const area = (mm2: number) => `${formatNumber(mm2 / mmPer(form.draft.units) ** 2, 1)} ${form.draft.units}²`;
  return (
    <>
      <Panel title="Unit of the drawing" aside={form.unitSaid ? (units.header === form.unit ? "as its header says" : "as you said") : "to be said"}>
        <div id="drawing-unit" tabIndex={-1} className="space-y-3">
          <Choice<DrawingUnit> label="Unit of the drawing" labelHidden value={form.unit} onChange={say} options={Object.keys(mmPerDrawingUnit).flatMap((name) => unitNames.filter((unit) => unit === name)).map((unit) => ({ value: unit, label: unit === "in" ? "inch" : unit }))} />
          {form.unitSaid ? null : (
            <Notice tone="caution" title={units.header === null ? "The file does not say its unit" : `The header says ${drawingUnitName[units.header]}, the sizes say ${drawingUnitName[units.unit]}`}>
              <p>{units.reasons.slice(1).join(" ")}</p>
              <Button look="plain" size="small" onClick={() => say(form.unit)}>It is in {drawingUnitName[form.unit]}</Button>
            </Notice>
          )}
        </div>
      </Panel>
      <Panel title="Lines" aside="by layer, colour and line type">
        <div id="drawing-lines" tabIndex={-1} className="space-y-3">
          <LineGroupTable groups={groups} roles={form.roles} onRole={(key, role) => set({ roles: { ...form.roles, [key]: role } })} />
          <div className="grid grid-cols-2 gap-x-4 gap-y-3">
            <NumberInput id="drawing-gap" label="Close gaps up to" unit="mm" value={form.gap} onChange={(event) => set({ gap: event.target.value })} error={gapOf(form.gap) === null ? "Type a length from 0 to 5 mm." : undefined} />
            {flat.contours.length < 2 ? null : (
              <Select id="drawing-contour" label="Edge of the sheet" value={String(form.contour)} onChange={(value) => set({ contour: Number(value) })}
                options={flat.contours.slice(0, SHOWN_CONTOURS).map((loop, i) => ({ value: String(i), label: i === 0 ? "Largest contour" : `Contour ${i + 1} by size`, note: area(loop.area) }))} />
            )}
          </div>
          {flat.singleLines.length === 0 ? null : (
            <Notice tone={form.singleLines === "out" ? "caution" : "note"} title={`${flat.singleLines.length} single ${flat.singleLines.length === 1 ? "line lies" : "lines lie"} inside the contour, drawn like it`}>
              <Choice<ImportForm["singleLines"]> label="Single lines are" small value={form.singleLines} onChange={(singleLines) => set({ singleLines })}
                options={[{ value: "up", label: "bends up" }, { value: "down", label: "bends down" }, { value: "out", label: "left out" }]} />
            </Notice>
          )}
        </div>
      </Panel>
    </>
  );
}
