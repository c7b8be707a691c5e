"use client";
import { Button } from "@/components/ui/Button";
import { Hint } from "@/components/ui/Hint";
import { quickStarts, withQuickStart, type QuickStart } from "../draft/startDraft";
import { useEditor } from "./editorContext";

const shapes: Readonly<Record<QuickStart, string>> = {
  L: "M4 3v14h14", U: "M4 3v14h16V3", Z: "M3 17h9V4h9", hat: "M1 17h5V4h12v13h5", tray: "M2 8l3 9h14l3-9M5 17V9h14v8",
};

/** A shape to begin with; its lengths are then changed. */
export function QuickStarts() {
  const { update } = useEditor();
  return (
    <div role="group" aria-label="Begin with a shape" className="flex flex-wrap gap-2">
      {quickStarts.map(({ id, label, says }) => (
        <Hint key={id} text={says}>
          <Button look="plain" size="small" aria-label={`Begin with: ${says}`} onClick={() => update((draft) => withQuickStart(draft, id))}
            icon={<svg aria-hidden viewBox="0 0 24 20" fill="none" stroke="currentColor" strokeWidth="2"><path d={shapes[id]} /></svg>}>
            {label}
          </Button>
        </Hint>
      ))}
    </div>
  );
}
