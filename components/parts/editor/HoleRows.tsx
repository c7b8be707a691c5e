"use client";
import { Plus, Trash2 } from "lucide-react";
import { Button } from "@/components/ui/Button";
import { IconButton } from "@/components/ui/IconButton";
import { rowKey } from "../draft/newRows";
import type { HoleDraft } from "../draft/partDraft";
import { PathField } from "./PathField";
import { RowProblems } from "./RowProblems";

interface HoleRowsProps {
  /** Path of the face in the document: `base` or `flanges[2]`. */
  readonly at: string;
  readonly holes: readonly HoleDraft[];
  readonly onChange: (holes: readonly HoleDraft[]) => void;
}

/** Round holes by middle and diameter; slots and polygons that a document brought are kept. */
export function HoleRows({ at, holes, onChange }: HoleRowsProps) {
  const edit = (key: string, change: { readonly x?: string; readonly y?: string; readonly diameter?: string }) =>
    onChange(holes.map((hole) => (hole.key === key && hole.kind === "circle" ? { ...hole, ...change } : hole)));
  return (
    <div>
      <p className="mb-1 text-sm font-medium text-ink-soft">Holes</p>
      <ol>
        {holes.map((hole, i) => {
          const path = `${at}.holes[${i}]`;
          return (
            <li key={hole.key} className="py-1">
              <div className="grid grid-cols-[repeat(3,minmax(4.5rem,8rem))_auto] items-start gap-3">
                {hole.kind === "kept" ? <span className="col-span-3 pt-2">{"slot" in hole.hole ? "slot" : "polygon"}, as in the document</span> : (
                  <>
                    <PathField path={`${path}.circle[0]`} label={`Hole ${i + 1} x`} labelHidden value={hole.x} onChange={(x) => edit(hole.key, { x })} placeholder="x" />
                    <PathField path={`${path}.circle[1]`} label={`Hole ${i + 1} y`} labelHidden value={hole.y} onChange={(y) => edit(hole.key, { y })} placeholder="y" />
                    <PathField path={`${path}.diameter`} label={`Hole ${i + 1} diameter`} labelHidden value={hole.diameter} onChange={(diameter) => edit(hole.key, { diameter })} placeholder="diameter" />
                  </>
                )}
                <IconButton label={`Remove hole ${i + 1}`} danger onClick={() => onChange(holes.filter((one) => one.key !== hole.key))}><Trash2 aria-hidden /></IconButton>
              </div>
              <RowProblems paths={[path, `${path}.circle`, `${path}.circle[0]`, `${path}.circle[1]`, `${path}.diameter`]} />
            </li>
          );
        })}
      </ol>
      <Button look="plain" size="small" icon={<Plus aria-hidden />} onClick={() => onChange([...holes, { key: rowKey(), kind: "circle", x: "", y: "", diameter: "" }])}>Add a round hole</Button>
    </div>
  );
}
