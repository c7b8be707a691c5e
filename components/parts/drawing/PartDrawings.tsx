"use client";
import type { ReactNode } from "react";
import type { LengthUnit } from "@/bending/core/units";
import type { FlatPattern } from "@/bending/part/flatPattern";
import type { DimensionKind } from "@/bending/part/partDocument";
import type { PartModel } from "@/bending/part/partModel";
import type { MarkedSheet } from "@/components/preview/markedSheet";
import { PartPreview } from "@/components/preview/PartPreview";
import type { View } from "@/components/ui/drawing/fitView";
import type { PartPicking } from "@/components/preview/partPicking";
import { FlatDrawing } from "./FlatDrawing";
import { SectionDrawing } from "./SectionDrawing";

interface PartDrawingsProps {
  readonly part: PartModel;
  readonly flat: FlatPattern;
  readonly units: LengthUnit;
  readonly dimension: DimensionKind;
  readonly stale?: boolean;
  readonly picking?: PartPicking;
  /** Marks over the flat, and what is marked of the folded part. */
  readonly overFlat?: ((view: View) => ReactNode) | undefined;
  readonly marked?: MarkedSheet | undefined;
}

/** Section, 3D and flat of a part, one under the other. */
export function PartDrawings({ part, flat, units, dimension, stale = false, picking, overFlat, marked }: PartDrawingsProps) {
  return (
    <div className="grid grid-cols-1 gap-4 min-[110rem]:grid-cols-2">
      <SectionDrawing part={part} units={units} dimension={dimension} stale={stale} />
      <figure className="border border-steel-500 bg-sheet">
        <div className={stale ? "h-72 opacity-40" : "h-72"}><PartPreview part={part} angles={part.bends.map((bend) => bend.angle)} picking={picking} marked={marked} /></div>
        <figcaption className="flex justify-between border-t border-steel-500 px-3 py-1"><span className="caption">Folded</span><span className="text-sm text-ink-soft">{picking === undefined ? "drag to turn, wheel to come nearer" : "click a face to work on it, an edge to add a flange"}</span></figcaption>
      </figure>
      <div className="min-[110rem]:col-span-2"><FlatDrawing flat={flat} units={units} stale={stale} over={overFlat} {...(picking === undefined ? {} : { picking: { ...picking, faces: part.faces } })} /></div>
    </div>
  );
}
