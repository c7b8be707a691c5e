"use client";
import { useMemo } from "react";
import { CanvasTexture, DoubleSide, EdgesGeometry, Path, RepeatWrapping, Shape, ShapeGeometry, Vector2 } from "three";
import { applyFrame } from "@/bending/geometry/applyFrame";
import type { Frame } from "@/bending/geometry/frame";
import type { Face, PartModel } from "@/bending/part/partModel";
import { EdgeMark } from "./EdgeMark";
import { frameMatrix } from "./frameMatrix";
import type { MarkedSheet } from "./markedSheet";
import { stageColours, type StageTheme } from "./stageColours";
import { useDispose } from "./useDispose";

interface SheetMarksProps {
  readonly part: PartModel;
  readonly frames: readonly Frame[];
  readonly marked: MarkedSheet;
  readonly theme: StageTheme;
}

/** mm that a mark stands off the sheet, so that it is not lost in it. */
const OFF_MM = 0.2;

/** Marked faces hatched and outlined on both sides, marked bends with bars where they begin. */
export function SheetMarks({ part, frames, marked, theme }: SheetMarksProps) {
  const colour = stageColours[theme].mark;
  const { size, ids } = useMemo(() => ({
    size: Math.hypot(...[0, 1].map((axis) => Math.max(...part.faces.flatMap((face) => face.outline.map((p) => Math.abs(p[axis] ?? 0)))))),
    ids: { faces: new Set(marked.faces), bends: new Set(marked.bends) },
  }), [part, marked]);
  const hatch = useMemo(() => hatchTexture(colour, Math.max(3, size / 40)), [colour, size]);
  useDispose(hatch);
  return (
    <>
      {part.faces.map((face, index) => {
        const frame = frames[index];
        return frame && ids.faces.has(face.id) ? <FaceMark key={face.id} face={face} thickness={part.thickness} frame={frame} hatch={hatch} colour={colour} /> : null;
      })}
      {part.bends.map((bend) => {
        const frame = frames[bend.parent];
        if (!frame || !ids.bends.has(bend.id)) return null;
        const [[ax, ay], , , [bx, by]] = bend.zone;
        return [-OFF_MM, part.thickness + OFF_MM].map((z) => (
          <EdgeMark key={`${bend.id} ${z}`} from={applyFrame(frame, [ax, ay, z])} to={applyFrame(frame, [bx, by, z])} radius={Math.max(0.4, size / 250)} colour={colour} />
        ));
      })}
    </>
  );
}

function FaceMark({ face, thickness, frame, hatch, colour }: { readonly face: Face; readonly thickness: number; readonly frame: Frame; readonly hatch: CanvasTexture; readonly colour: string }) {
  const plane = useMemo(() => {
    const shape = new Shape(face.outline.map(([x, y]) => new Vector2(x, y)));
    shape.holes = face.holes.map((hole) => new Path(hole.map(([x, y]) => new Vector2(x, y))));
    return new ShapeGeometry(shape);
  }, [face]);
  const edges = useMemo(() => new EdgesGeometry(plane), [plane]);
  useDispose(plane);
  useDispose(edges);
  return (
    <group matrixAutoUpdate={false} matrix={frameMatrix(frame)}>
      {[-OFF_MM, thickness + OFF_MM].map((z) => (
        <group key={z} position={[0, 0, z]}>
          <mesh geometry={plane}><meshBasicMaterial map={hatch} transparent side={DoubleSide} depthWrite={false} /></mesh>
          <lineSegments geometry={edges}><lineBasicMaterial color={colour} /></lineSegments>
        </group>
      ))}
    </group>
  );
}

/** Slanted lines on nothing, one every `pitch` mm; a plane's own texture coordinates are its millimetres. */
function hatchTexture(colour: string, pitch: number): CanvasTexture {
  const canvas = document.createElement("canvas");
  canvas.width = canvas.height = 64;
  const context = canvas.getContext("2d");
  if (context) {
    context.strokeStyle = colour;
    context.lineWidth = 18;
    for (const from of [-64, 0, 64]) {
      context.beginPath();
      context.moveTo(from - 8, 72);
      context.lineTo(from + 72, -8);
      context.stroke();
    }
  }
  const texture = new CanvasTexture(canvas);
  texture.wrapS = texture.wrapT = RepeatWrapping;
  texture.repeat.set(1 / pitch, 1 / pitch);
  return texture;
}
