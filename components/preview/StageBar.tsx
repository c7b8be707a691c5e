"use client";
import { PencilRuler, SquareSplitHorizontal } from "lucide-react";
import { Choice } from "@/components/ui/Choice";
import { classes } from "@/components/ui/classes";
import type { ViewPreset } from "./viewDirections";

export interface StageLook {
  readonly preset: ViewPreset;
  readonly section: boolean;
  readonly drawn: boolean;
}

interface StageBarProps {
  readonly look: StageLook;
  readonly onLook: (look: StageLook) => void;
  readonly canDraw3d: boolean;
}

/** From where the stage is seen, cut open or not, in 3D or drawn. */
export function StageBar({ look, onLook, canDraw3d }: StageBarProps) {
  const solid = canDraw3d && !look.drawn;
  return (
    <div className="flex flex-wrap items-center justify-between gap-2 border-b border-rule p-2">
      {solid ? (
        <Choice<ViewPreset> label="View" labelHidden small value={look.preset} onChange={(preset) => onLook({ ...look, preset })}
          options={[{ value: "3d", label: "3D" }, { value: "front", label: "Front" }, { value: "side", label: "Side" }, { value: "above", label: "Above" }]} />
      ) : <p className="text-sm text-ink-soft">{canDraw3d ? "Section through the bend" : "This browser has no 3D: section through the bend"}</p>}
      <div className="flex gap-2">
        {solid ? <Switch on={look.section} onClick={() => onLook({ ...look, section: !look.section })}><SquareSplitHorizontal aria-hidden />Section</Switch> : null}
        {canDraw3d ? <Switch on={look.drawn} onClick={() => onLook({ ...look, drawn: !look.drawn })}><PencilRuler aria-hidden />Drawn view</Switch> : null}
      </div>
    </div>
  );
}

function Switch({ on, onClick, children }: { readonly on: boolean; readonly onClick: () => void; readonly children: React.ReactNode }) {
  return (
    <button type="button" aria-pressed={on} onClick={onClick}
      className={classes("inline-flex min-h-9 items-center gap-1.5 rounded border border-rule-strong px-2 text-sm [&_svg]:size-4", on ? "bg-ink text-paper" : "bg-sheet hover:bg-wash")}>
      {children}
    </button>
  );
}
