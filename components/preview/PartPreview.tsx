"use client";
import { lazy, Suspense, useState } from "react";
import type { FormedAngles, PartModel } from "@/bending/part/partModel";
import { DrawnOnFailure } from "./DrawnOnFailure";
import { PartDrawing } from "./PartDrawing";
import type { PartPicking } from "./partPicking";
import type { MarkedSheet } from "./markedSheet";
import type { StageTheme } from "./stageColours";
import { useHasWebGl } from "./useHasWebGl";

const PartScene = lazy(() => import("./PartScene"));

interface PartPreviewProps {
  readonly part: PartModel;
  readonly angles: FormedAngles;
  readonly theme?: StageTheme;
  readonly marked?: MarkedSheet | undefined;
  readonly picking?: PartPicking | undefined;
}

/** The folded part in 3D, filling its parent; a drawn view takes its place where 3D is not to be had. */
export function PartPreview({ part, angles, theme = "light", marked, picking }: PartPreviewProps) {
  const able = useHasWebGl();
  const [lost, setLost] = useState(false);
  const drawn = <PartDrawing part={part} angles={angles} className="size-full" />;
  if (able === null) return <div className="size-full" aria-busy />;
  if (!able || lost) return drawn;
  return (
    <DrawnOnFailure instead={drawn}>
      <Suspense fallback={<div className="size-full" aria-busy />}>
        <PartScene part={part} angles={angles} theme={theme} marked={marked} picking={picking} onLost={() => setLost(true)} />
      </Suspense>
    </DrawnOnFailure>
  );
}
