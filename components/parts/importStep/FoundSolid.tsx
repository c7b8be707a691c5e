"use client";
import type { RecognisedPart } from "@/bending/exchange/step/recognisedPart";
import type { SolidMesh } from "@/bending/exchange/step/solidMesh";
import { identityFrame } from "@/bending/geometry/identityFrame";
import { PartDrawing } from "@/components/preview/PartDrawing";
import { SolidPreview } from "@/components/preview/SolidPreview";
import type { ImportedModel } from "./importedModel";

interface FoundSolidProps {
  readonly part: RecognisedPart;
  readonly mesh: SolidMesh;
  readonly model: ImportedModel | null;
  readonly marked: readonly number[];
}

/** The solid of the file, its faces shaded by what was recognised in them. */
export function FoundSolid({ part, mesh, model, marked }: FoundSolidProps) {
  const instead = model === null ? <p className="p-4 text-ink-soft">The part is drawn when its fields are right.</p>
    : <PartDrawing part={model.part} angles={model.part.bends.map(({ angle }) => angle)} className="size-full" />;
  return (
    <figure className="border border-steel-500 bg-sheet">
      <div className="h-96"><SolidPreview mesh={mesh} roles={part.roles} base={part.plates[0]?.frame ?? identityFrame} marked={marked} label="The solid of the file" instead={instead} /></div>
      <figcaption className="flex flex-wrap justify-between gap-x-4 border-t border-steel-500 px-3 py-1">
        <span className="caption">Solid of the file</span>
        <span className="text-sm text-ink-soft">{part.leftOut.length > 0 ? "hatched: not understood; " : ""}drag to turn, wheel to come nearer</span>
      </figcaption>
    </figure>
  );
}
