"use client";
import { ChevronDown, CornerDownRight, Plus, Trash2 } from "lucide-react";
import { useState } from "react";
import type { BendDirection } from "@/bending/part/partDocument";
import { Choice } from "@/components/ui/Choice";
import { IconButton } from "@/components/ui/IconButton";
import { Select } from "@/components/ui/Select";
import { TextInput } from "@/components/ui/TextInput";
import { edgeNames } from "../draft/edgeNames";
import type { FlangeDraft } from "../draft/partDraft";
import { useEditor } from "./editorContext";
import { fieldId } from "./fieldId";
import { FlangeOptions } from "./FlangeOptions";
import { PathField } from "./PathField";
import { RowProblems } from "./RowProblems";

interface FlangeRowProps {
  readonly flange: FlangeDraft;
  /** Place in the document, which is where its problems point. */
  readonly index: number;
  readonly depth: number;
  readonly onChange: (change: Partial<FlangeDraft>) => void;
  readonly onRemove: () => void;
  readonly onAdd: () => void;
}

export function FlangeRow({ flange, index, depth, onChange, onRemove, onAdd }: FlangeRowProps) {
  const { draft, problemAt } = useEditor();
  const [open, setOpen] = useState(false);
  const at = `flanges[${index}]`;
  const edges = edgeNames(draft, flange.on);
  return (
    <li className="border-b border-rule py-2" style={{ paddingLeft: `${Math.min(depth, 4) * 1.25}rem` }}>
      <div className="flex items-start gap-2">
        {depth === 0 ? null : <CornerDownRight aria-hidden className="mt-2.5 size-4 shrink-0 text-steel-400" />}
        <div className="grid grow grid-cols-2 gap-2 sm:grid-cols-[minmax(4rem,1.1fr)_minmax(5rem,1.2fr)_minmax(4.5rem,0.8fr)_minmax(4rem,0.6fr)_auto]">
          <TextInput id={fieldId(`${at}.id`)} label="Name of the flange" labelHidden value={flange.id} onChange={(event) => onChange({ id: event.target.value })} error={problemAt(`${at}.id`)} errorHidden />
          <Select id={fieldId(`${at}.edge`)} label={`Edge of ${flange.on}`} labelHidden value={String(flange.edge)} onChange={(edge) => onChange({ edge: Number(edge) })} error={problemAt(`${at}.edge`)} errorHidden
            options={edges.map(({ edge, name }) => ({ value: String(edge), label: name }))} placeholder="edge" />
          {flange.outline === null
            ? <PathField path={`${at}.length`} label="Length" labelHidden value={flange.length} onChange={(length) => onChange({ length })} placeholder="length" />
            : <span className="pt-2 text-sm text-ink-faint">own outline</span>}
          <PathField path={`${at}.angle`} label="Angle" labelHidden kind="angle" value={flange.angle} onChange={(angle) => onChange({ angle })} />
          <Choice<BendDirection> label="Direction" labelHidden small value={flange.direction} onChange={(direction) => onChange({ direction })}
            options={[{ value: "up", label: "up" }, { value: "down", label: "down" }]} />
        </div>
        <span className="flex shrink-0">
          <IconButton label={`Add a flange on ${flange.id}`} onClick={onAdd}><Plus aria-hidden /></IconButton>
          <IconButton label={open ? `Less about ${flange.id}` : `More about ${flange.id}: insets, tapers, relief, hem`} aria-expanded={open} onClick={() => setOpen(!open)}>
            <ChevronDown aria-hidden className={open ? "rotate-180" : undefined} /></IconButton>
          <IconButton label={`Remove ${flange.id} and what hangs on it`} danger onClick={onRemove}><Trash2 aria-hidden /></IconButton>
        </span>
      </div>
      <RowProblems paths={[`${at}.id`, `${at}.edge`, `${at}.length`, `${at}.angle`, at]} />
      {open ? <FlangeOptions at={at} flange={flange} onChange={onChange} /> : null}
    </li>
  );
}
