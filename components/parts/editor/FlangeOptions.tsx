"use client";
import { Select } from "@/components/ui/Select";
import type { FlangeDraft } from "../draft/partDraft";
import { keysOfBranch } from "../draft/flangeTree";
import { BendOptions } from "./BendOptions";
import { CutFields } from "./CutFields";
import { useEditor } from "./editorContext";
import { fieldId } from "./fieldId";
import { HoleRows } from "./HoleRows";
import { PathField } from "./PathField";

const dimensions: readonly { readonly value: FlangeDraft["dimension"]; readonly label: string }[] = [
  { value: "part", label: "as the part" }, { value: "outside", label: "outside" }, { value: "inside", label: "inside" }, { value: "tangent", label: "tangent" },
];

interface FlangeOptionsProps {
  readonly at: string;
  readonly flange: FlangeDraft;
  readonly onChange: (change: Partial<FlangeDraft>) => void;
}

/** The rarer things that a flange may say. */
export function FlangeOptions({ at, flange, onChange }: FlangeOptionsProps) {
  const { draft, problemAt } = useEditor();
  const under = keysOfBranch(draft.flanges, flange.key);
  const faces = ["base", ...draft.flanges.filter((one) => !under.has(one.key)).map((one) => one.id)].filter((id) => id.trim() !== "");
  const inset = { placeholder: "0" };
  return (
    <div className="mt-2 space-y-3">
      <div className="grid grid-cols-2 gap-3 border-l-2 border-rule-strong pl-4 sm:grid-cols-4">
        <Select id={fieldId(`${at}.on`)} label="Stands on" value={flange.on} onChange={(on) => onChange({ on, edge: on === "base" ? 0 : 2 })} error={problemAt(`${at}.on`)} options={faces.map((face) => ({ value: face, label: face }))} />
        <Select id={fieldId(`${at}.dimension`)} label="Measured" value={flange.dimension} options={dimensions} onChange={(value) => onChange({ dimension: dimensions.find((one) => one.value === value)?.value ?? "part" })} />
        <PathField path={`${at}.start`} label="Inset at start" value={flange.start} onChange={(start) => onChange({ start })} {...inset} />
        <PathField path={`${at}.end`} label="Inset at end" value={flange.end} onChange={(end) => onChange({ end })} {...inset} />
        <PathField path={`${at}.startAngle`} label="Side at start" kind="angle" value={flange.startAngle} onChange={(startAngle) => onChange({ startAngle })} placeholder="90" />
        <PathField path={`${at}.endAngle`} label="Side at end" kind="angle" value={flange.endAngle} onChange={(endAngle) => onChange({ endAngle })} placeholder="90" />
        <CutFields at={at} relief={flange.relief} corner={flange.corner} otherwise={{ relief: "as the part", corner: "as the part" }} onChange={onChange} />
        <PathField path={`${at}.offset.height`} label="Offset height" value={flange.offsetHeight} onChange={(offsetHeight) => onChange({ offsetHeight })} placeholder="no offset" />
        <PathField path={`${at}.toleranceLength`} label="Length tolerance ±" value={flange.toleranceLength} onChange={(toleranceLength) => onChange({ toleranceLength })} placeholder="as the part" />
      </div>
      <BendOptions at={at} bend={flange} onChange={onChange} />
      <div className="border-l-2 border-rule-strong pl-4"><HoleRows at={at} holes={flange.holes} onChange={(holes) => onChange({ holes })} /></div>
    </div>
  );
}
