"use client";
import { Plus } from "lucide-react";
import { useRef } from "react";
import { flushSync } from "react-dom";
import { Button } from "@/components/ui/Button";
import { Notice } from "@/components/ui/Notice";
import { newBend, newLeg } from "../draft/newRows";
import type { BendDraft, LegDraft } from "../draft/partDraft";
import { useEditor } from "./editorContext";
import { fieldId } from "./fieldId";
import { LegRow } from "./LegRow";
import { PathField } from "./PathField";

/** Legs and the bends between them, from the first leg on. */
export function ProfileFields() {
  const { draft, update, problemAt } = useEditor();
  const list = useRef<HTMLOListElement>(null);
  const setLegs = (change: (legs: readonly LegDraft[]) => readonly LegDraft[]) => update((old) => ({ ...old, legs: change(old.legs) }));
  const focusLeg = (index: number) => list.current?.querySelector<HTMLInputElement>(`#${CSS.escape(fieldId(`profile.legs[${index}]`))}`)?.focus();
  const insert = (index: number) => {
    // Drawn at once: the next key already belongs to the new leg.
    flushSync(() => setLegs((legs) => [...legs.slice(0, index + 1), newLeg("", newBend("90", legs[index]?.bend.direction ?? "up")), ...legs.slice(index + 1)]));
    focusLeg(index + 1);
  };
  const remove = (index: number) => {
    if (draft.legs.length <= 1) return;
    flushSync(() => setLegs((legs) => legs.filter((_, i) => i !== index)));
    focusLeg(Math.max(0, index - 1));
  };
  const problem = problemAt("profile.bends") ?? problemAt("profile.legs");
  return (
    <div className="space-y-3">
      <PathField path="profile.width" label="Width (along the bends)" value={draft.width} onChange={(width) => update((old) => ({ ...old, width }))} className="max-w-56" />
      {problem === undefined ? null : <Notice tone="wrong" title={problem} />}
      <ol ref={list} className="border-t border-rule">
        {draft.legs.map((leg, index) => (
          <LegRow key={leg.key} leg={leg} index={index} last={index === draft.legs.length - 1} only={draft.legs.length === 1}
            onLength={(length) => setLegs((legs) => legs.map((one) => (one.key === leg.key ? { ...one, length } : one)))}
            onBend={(change: Partial<BendDraft>) => setLegs((legs) => legs.map((one) => (one.key === leg.key ? { ...one, bend: { ...one.bend, ...change } } : one)))}
            onInsert={() => insert(index)} onRemove={() => remove(index)} />
        ))}
      </ol>
      <div className="flex flex-wrap items-center gap-4">
        <Button look="plain" size="small" icon={<Plus aria-hidden />} onClick={() => insert(draft.legs.length - 1)}>Add a leg</Button>
        <p className="text-sm text-ink-faint">In a length: <kbd className="num">Enter</kbd> adds a leg after it, <kbd className="num">Ctrl Del</kbd> removes it.</p>
      </div>
    </div>
  );
}
