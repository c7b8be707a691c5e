"use client";
import { Plus } from "lucide-react";
import { Button } from "@/components/ui/Button";
import { newHole } from "../draft/newRows";
import type { HoleDraft } from "../draft/partDraft";
import { HoleRow } from "./HoleRow";

interface HoleRowsProps {
  /** Path of the face in the document: `base` or `flanges[2]`. */
  readonly at: string;
  readonly holes: readonly HoleDraft[];
  readonly onChange: (holes: readonly HoleDraft[]) => void;
}

const kinds = [{ kind: "circle", label: "Add a round hole" }, { kind: "slot", label: "a slot" }, { kind: "rectangle", label: "a rectangle" }] as const;

/** Round holes, slots by the middles of their ends, rectangles by their lower left corner; other polygons are kept. */
export function HoleRows({ at, holes, onChange }: HoleRowsProps) {
  return (
    <div>
      <p className="mb-1 text-sm font-medium text-ink-soft">Holes</p>
      <ol>
        {holes.map((hole, i) => (
          <HoleRow key={hole.key} path={`${at}.holes[${i}]`} number={i + 1} hole={hole} onChange={(next) => onChange(holes.map((one) => (one.key === hole.key ? next : one)))}
            onRemove={() => onChange(holes.filter((one) => one.key !== hole.key))} />
        ))}
      </ol>
      <div className="flex flex-wrap gap-2">
        {kinds.map(({ kind, label }) => (
          <Button key={kind} look="plain" size="small" icon={<Plus aria-hidden />} onClick={() => onChange([...holes, newHole(kind)])}>{label}</Button>
        ))}
      </div>
    </div>
  );
}
