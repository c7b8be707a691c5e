"use client";
import { useMemo } from "react";
import { applyFrame } from "@/bending/geometry/applyFrame";
import { foldFrames } from "@/bending/part/foldFrames";
import type { FormedAngles, PartModel } from "@/bending/part/partModel";
import { FitView, type FitTarget } from "./FitView";
import type { MarkedSheet } from "./markedSheet";
import { SheetMarks } from "./SheetMarks";
import { SheetMesh } from "./SheetMesh";
import type { PartPicking } from "./partPicking";
import { PickEdges } from "./PickEdges";
import { StageCanvas } from "./StageCanvas";
import { stageColours, type StageTheme } from "./stageColours";

export interface PartSceneProps {
  readonly part: PartModel;
  readonly angles: FormedAngles;
  readonly theme: StageTheme;
  readonly marked?: MarkedSheet | undefined;
  readonly onLost: () => void;
  readonly picking?: PartPicking | undefined;
}

/** The folded part on its own, base flat, its top up. */
export default function PartScene({ part, angles, theme, marked, onLost, picking }: PartSceneProps) {
  const frames = useMemo(() => foldFrames(part, angles), [part, angles]);
  const target = useMemo(() => partTarget(part, angles), [part, angles]);
  return (
    <StageCanvas theme={theme} label={`The part ${part.name}, folded`} onLost={onLost}>
      <FitView preset="part" target={target} />
      <group rotation={[-Math.PI / 2, 0, 0]}>
        <SheetMesh part={part} frames={frames} angles={angles} theme={theme} picking={picking} />
        {marked === undefined ? null : <SheetMarks part={part} frames={frames} marked={marked} theme={theme} />}
        {picking === undefined ? null : <PickEdges part={part} frames={frames} picking={picking} radius={target.radius * EDGE_SHARE} colour={stageColours[theme].edge} />}
      </group>
    </StageCanvas>
  );
}

/** Thickness of a bar along an edge, as a part of the view. */
const EDGE_SHARE = 0.018;

/** In the view's axes: the part's z stands up. */
function partTarget(part: PartModel, angles: FormedAngles): FitTarget {
  const frames = foldFrames(part, angles);
  const corners = part.faces.flatMap((face, index) => {
    const frame = frames[index];
    return frame ? face.outline.map(([x, y]) => applyFrame(frame, [x, y, 0])) : [];
  });
  const range = (axis: 0 | 1 | 2) => {
    const values = corners.map((corner) => corner[axis]);
    return { middle: (Math.min(...values) + Math.max(...values)) / 2, size: Math.max(...values) - Math.min(...values) };
  };
  const [x, y, z] = [range(0), range(1), range(2)];
  return { centre: [x.middle, z.middle, -y.middle], radius: Math.max(5, (Math.hypot(x.size, y.size, z.size) / 2) * 1.05) };
}
