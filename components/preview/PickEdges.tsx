"use client";
import { useState } from "react";
import type { Frame } from "@/bending/geometry/frame";
import { applyFrame } from "@/bending/geometry/applyFrame";
import type { PartModel } from "@/bending/part/partModel";
import { EdgeMark } from "./EdgeMark";
import type { FaceEdge, PartPicking } from "./partPicking";

interface PickEdgesProps {
  readonly part: PartModel;
  readonly frames: readonly Frame[];
  readonly picking: PartPicking;
  readonly radius: number;
  readonly colour: string;
}

/** The free edges of a folded part: a bar shows where a click adds a flange. */
export function PickEdges({ part, frames, picking, radius, colour }: PickEdgesProps) {
  const [under, setUnder] = useState<FaceEdge | null>(null);
  return picking.edges.map((edge) => {
    const frame = frames[part.faces.findIndex(({ id }) => id === edge.face)];
    if (frame === undefined) return null;
    const [from, to] = edge.line.map(([x, y]) => applyFrame(frame, [x, y, part.thickness / 2]));
    if (from === undefined || to === undefined) return null;
    return (
      <group key={`${edge.face} ${edge.edge}`}
        onPointerOver={(event) => { event.stopPropagation(); setUnder(edge); }} onPointerOut={() => setUnder(null)}
        onClick={(event) => { if (event.delta > DRAGGED_PX) return; event.stopPropagation(); setUnder(null); picking.onEdge(edge); }}>
        <EdgeMark from={from} to={to} radius={radius} colour={colour} opacity={under === edge ? 1 : 0} />
      </group>
    );
  });
}

/** A press that moved farther turned the view. */
export const DRAGGED_PX = 4;
