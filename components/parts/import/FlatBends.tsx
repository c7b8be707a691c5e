"use client";
import { useState } from "react";
import { useEditor } from "../editor/editorContext";
import { BendLineTable } from "./BendLineTable";

/** A flat that came in as a drawing: its contours are kept, its bends are edited. */
export function FlatBends() {
  const { draft } = useEditor();
  const [selected, setSelected] = useState<number | null>(null);
  const holes = draft.flat?.holes?.length ?? 0;
  return (
    <div className="space-y-3">
      <p className="text-ink-soft">A flat as drawn: contour and {holes} {holes === 1 ? "hole" : "holes"} stay as they are; import the drawing again to change them.</p>
      <BendLineTable selected={selected} onSelect={setSelected} />
    </div>
  );
}
