"use client";
import { useState } from "react";
import type { Vec2 } from "@/bending/geometry/vec2";
import { Choice } from "@/components/ui/Choice";
import { FlatFacts } from "../drawing/FlatFacts";
import { PartDrawings } from "../drawing/PartDrawings";
import type { PartDraft } from "../draft/partDraft";
import type { usePreview } from "../editor/usePreview";
import { PartFindings } from "../findings/PartFindings";
import type { DrawingFacts } from "./drawingMessages";
import { DrawingPreview } from "./DrawingPreview";
import type { ImportForm } from "./importForm";
import { MendedLists } from "./MendedLists";
import type { FoundDrawing } from "./useDrawing";

interface ReadSheetProps {
  readonly draft: PartDraft;
  readonly facts: DrawingFacts;
  readonly found: FoundDrawing;
  readonly form: ImportForm;
  readonly preview: ReturnType<typeof usePreview>;
  readonly selected: number | null;
  readonly onSelect: (index: number) => void;
  readonly place: Vec2 | null;
  readonly onPlace: (place: Vec2) => void;
}

/** The drawing, what was mended in it, and the part that comes of it. */
export function ReadSheet({ draft, facts, found, form, preview, selected, onSelect, place, onPlace }: ReadSheetProps) {
  const [view, setView] = useState<"part" | "whole">("part");
  const { shown, model } = preview;
  const bends = (draft.flat?.bends ?? []).flatMap((entry, i) => { const row = draft.flatBends[i]; return row === undefined ? [] : [{ entry, row }]; });
  return (
    <div className="space-y-5">
      <div className="space-y-3 bg-paper">
        <DrawingPreview found={found} roles={facts.groups.map(({ key }) => form.roles[key] ?? "cut")} bends={bends} selected={selected} onSelect={onSelect} place={place} whole={view === "whole"}
          note={<Choice<"part" | "whole"> label="Shown" labelHidden small value={view} onChange={setView} options={[{ value: "part", label: "The sheet" }, { value: "whole", label: "Whole drawing" }]} />} />
        <MendedLists flat={found.flat} facts={facts} onPlace={onPlace} />
      </div>
      {shown === null || draft.flat === null ? null : (
        <>
          <FlatFacts part={shown.part} flat={shown.flat} units={shown.document.units} stale={model === null} />
          <PartFindings model={shown}>{(marks) => <PartDrawings {...marks} part={shown.part} flat={shown.flat} units={shown.document.units} dimension={shown.document.dimension ?? "outside"} stale={model === null} />}</PartFindings>
        </>
      )}
    </div>
  );
}
