"use client";
import { ChevronDown, Trash2 } from "lucide-react";
import { useState, type KeyboardEvent } from "react";
import { Choice } from "@/components/ui/Choice";
import { IconButton } from "@/components/ui/IconButton";
import type { BendDirection } from "@/bending/part/partDocument";
import type { BendDraft, LegDraft } from "../draft/partDraft";
import { BendOptions } from "./BendOptions";
import { PathField } from "./PathField";
import { RowProblems } from "./RowProblems";

interface LegRowProps {
  readonly leg: LegDraft;
  readonly index: number;
  readonly last: boolean;
  readonly only: boolean;
  readonly onLength: (length: string) => void;
  readonly onBend: (change: Partial<BendDraft>) => void;
  readonly onInsert: () => void;
  readonly onRemove: () => void;
}

/** One leg with the bend that ends it. */
export function LegRow({ leg, index, last, only, onLength, onBend, onInsert, onRemove }: LegRowProps) {
  const [open, setOpen] = useState(leg.bend.insideRadius !== "" || leg.bend.kFactor !== "" || leg.bend.hem !== "none");
  const at = `profile.bends[${index}]`;
  const keys = (event: KeyboardEvent<HTMLInputElement>) => {
    if (event.key === "Enter") { event.preventDefault(); onInsert(); }
    if (event.key === "Delete" && event.ctrlKey) { event.preventDefault(); onRemove(); }
  };
  return (
    <li className="border-b border-rule py-2">
      <div className="grid grid-cols-[2rem_minmax(6rem,9rem)_minmax(5rem,6.5rem)_auto_1fr] items-start gap-x-3">
        <span className="num pt-2 text-ink-faint" aria-hidden>{index + 1}</span>
        <PathField path={`profile.legs[${index}]`} label={`Leg ${index + 1} length`} labelHidden value={leg.length} onChange={onLength} onKeyDown={keys} placeholder="length" />
        {last ? <span className="col-span-2 pt-2 text-sm text-ink-faint">last leg, no bend after it</span> : (
          <>
            <PathField path={`${at}.angle`} label={`Bend ${index + 1} angle`} labelHidden kind="angle" value={leg.bend.angle} onChange={(angle) => onBend({ angle })} />
            <Choice<BendDirection> label={`Bend ${index + 1} direction`} labelHidden value={leg.bend.direction} onChange={(direction) => onBend({ direction })}
              options={[{ value: "up", label: "up" }, { value: "down", label: "down" }]} />
          </>
        )}
        <span className="flex justify-end">
          {last ? null : <IconButton label={open ? `Less about bend ${index + 1}` : `More about bend ${index + 1}: radius, K, hem`} aria-expanded={open} onClick={() => setOpen(!open)}>
            <ChevronDown aria-hidden className={open ? "rotate-180" : undefined} /></IconButton>}
          <IconButton label={`Remove leg ${index + 1}`} danger disabled={only} onClick={onRemove}><Trash2 aria-hidden /></IconButton>
        </span>
      </div>
      <RowProblems paths={last ? [`profile.legs[${index}]`] : [`profile.legs[${index}]`, `${at}.angle`, at]} />
      {open && !last ? <BendOptions at={at} bend={leg.bend} onChange={onBend} /> : null}
    </li>
  );
}
