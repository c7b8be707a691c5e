"use client";
import { Plus } from "lucide-react";
import { Button } from "@/components/ui/Button";
import { flangeTree, keysOfBranch } from "../draft/flangeTree";
import type { FlangeDraft } from "../draft/partDraft";
import { addFlange } from "./addFlange";
import { useEditor } from "./editorContext";
import { FlangeRow } from "./FlangeRow";

/** The flanges as a tree: each under the face that carries it. */
export function FlangeFields() {
  const { draft, update } = useEditor();
  const edit = (key: string, change: Partial<FlangeDraft>) => update((old) => {
    const before = old.flanges.find((flange) => flange.key === key);
    const renamed = change.id !== undefined && before !== undefined ? { from: before.id, to: change.id } : null;
    return { ...old, flanges: old.flanges.map((flange) => {
      const next = flange.key === key ? { ...flange, ...change } : flange;
      return renamed !== null && next.key !== key && next.on === renamed.from ? { ...next, on: renamed.to } : next;
    }) };
  });
  const remove = (key: string) => update((old) => {
    const gone = keysOfBranch(old.flanges, key);
    return { ...old, flanges: old.flanges.filter((flange) => !gone.has(flange.key)) };
  });
  const rows = flangeTree(draft.flanges);
  return (
    <div className="space-y-3">
      {rows.length === 0 ? <p className="text-ink-soft">No flange yet. Add one here, or click an edge with a plus in the flat pattern.</p> : null}
      <ul className="border-t border-rule empty:border-0">
        {rows.map(({ flange, index, depth }) => (
          <FlangeRow key={flange.key} flange={flange} index={index} depth={depth} onChange={(change) => edit(flange.key, change)}
            onRemove={() => remove(flange.key)} onAdd={() => update((old) => addFlange(old, flange.id))} />
        ))}
      </ul>
      <Button look="plain" size="small" icon={<Plus aria-hidden />} onClick={() => update((old) => addFlange(old, "base"))}>Add a flange on the base</Button>
    </div>
  );
}
