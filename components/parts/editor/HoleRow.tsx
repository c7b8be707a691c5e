"use client";
import { Trash2 } from "lucide-react";
import { IconButton } from "@/components/ui/IconButton";
import type { HoleDraft } from "../draft/partDraft";
import { PathField } from "./PathField";
import { RowProblems } from "./RowProblems";

interface HoleRowProps {
  /** Path of the hole in the document. */
  readonly path: string;
  readonly number: number;
  readonly hole: HoleDraft;
  readonly onChange: (hole: HoleDraft) => void;
  readonly onRemove: () => void;
}

interface Entry { readonly at: string; readonly name: string; readonly value: string; readonly with: (text: string) => HoleDraft }

export function HoleRow({ path, number, hole, onChange, onRemove }: HoleRowProps) {
  const entries = entriesOf(hole);
  return (
    <li className="py-1">
      <div className="flex items-start gap-3">
        <span className="w-20 shrink-0 pt-2 text-sm text-ink-soft">{hole.kind === "kept" ? "polygon" : kinds[hole.kind]}</span>
        {hole.kind === "kept" ? <span className="grow pt-2">as in the document</span> : (
          <span className="grid grow grid-cols-[repeat(auto-fill,minmax(5.5rem,1fr))] gap-2">
            {entries.map((entry) => (
              <PathField key={entry.at} path={`${path}.${entry.at}`} label={`Hole ${number} ${entry.name}`} labelHidden value={entry.value} onChange={(text) => onChange(entry.with(text))} placeholder={entry.name} />
            ))}
          </span>
        )}
        <IconButton label={`Remove hole ${number}`} danger onClick={onRemove}><Trash2 aria-hidden /></IconButton>
      </div>
      <RowProblems paths={[path, `${path}.circle`, `${path}.slot`, `${path}.polygon`, ...entries.map((entry) => `${path}.${entry.at}`)]} />
    </li>
  );
}

const kinds = { circle: "round", slot: "slot", rectangle: "rectangle" } as const;

function entriesOf(hole: HoleDraft): readonly Entry[] {
  switch (hole.kind) {
    case "circle": return [
      { at: "circle[0]", name: "x", value: hole.x, with: (x) => ({ ...hole, x }) },
      { at: "circle[1]", name: "y", value: hole.y, with: (y) => ({ ...hole, y }) },
      { at: "diameter", name: "diameter", value: hole.diameter, with: (diameter) => ({ ...hole, diameter }) },
    ];
    case "slot": return [
      { at: "slot[0][0]", name: "from x", value: hole.x, with: (x) => ({ ...hole, x }) },
      { at: "slot[0][1]", name: "from y", value: hole.y, with: (y) => ({ ...hole, y }) },
      { at: "slot[1][0]", name: "to x", value: hole.toX, with: (toX) => ({ ...hole, toX }) },
      { at: "slot[1][1]", name: "to y", value: hole.toY, with: (toY) => ({ ...hole, toY }) },
      { at: "width", name: "width", value: hole.width, with: (width) => ({ ...hole, width }) },
    ];
    case "rectangle": return [
      { at: "polygon[0][0]", name: "x", value: hole.x, with: (x) => ({ ...hole, x }) },
      { at: "polygon[0][1]", name: "y", value: hole.y, with: (y) => ({ ...hole, y }) },
      { at: "polygon.width", name: "width", value: hole.width, with: (width) => ({ ...hole, width }) },
      { at: "polygon.height", name: "height", value: hole.height, with: (height) => ({ ...hole, height }) },
    ];
    case "kept": return [];
    default: return hole satisfies never;
  }
}
