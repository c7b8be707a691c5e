"use client";
import { useMemo } from "react";
import { DoubleSide, EdgesGeometry, type Plane } from "three";
import type { Frame } from "@/bending/geometry/frame";
import type { Bend, Face, FormedAngles, PartModel } from "@/bending/part/partModel";
import { bendGeometry } from "./bendGeometry";
import { faceGeometry } from "./faceGeometry";
import { frameMatrix } from "./frameMatrix";
import { SideLetters } from "./SideLetters";
import { stageColours, type StageTheme } from "./stageColours";
import { useDispose } from "./useDispose";

interface SheetMeshProps {
  readonly part: PartModel;
  readonly frames: readonly Frame[];
  readonly angles: FormedAngles;
  readonly theme: StageTheme;
  readonly clip?: readonly Plane[] | undefined;
  readonly letters?: boolean;
}

/** The sheet folded so far: faces, bend arcs, edges, and the letters of its two sides. */
export function SheetMesh({ part, frames, angles, theme, clip, letters = true }: SheetMeshProps) {
  return (
    <group>
      {part.faces.map((face, index) => {
        const frame = frames[index];
        return frame ? <FaceMesh key={face.id} face={face} thickness={part.thickness} frame={frame} theme={theme} clip={clip} /> : null;
      })}
      {part.bends.map((bend, index) => {
        const frame = frames[bend.parent];
        return frame ? <BendMesh key={bend.id} bend={bend} thickness={part.thickness} angle={angles[index] ?? 0} frame={frame} theme={theme} clip={clip} /> : null;
      })}
      {letters ? <SideLetters part={part} frames={frames} theme={theme} /> : null}
    </group>
  );
}

interface PieceProps { readonly thickness: number; readonly frame: Frame; readonly theme: StageTheme; readonly clip: readonly Plane[] | undefined }

function SheetMaterials({ theme, clip }: Pick<PieceProps, "theme" | "clip">) {
  const colours = stageColours[theme];
  const planes = clip ? [...clip] : null;
  return [colours.sideA, colours.sideB, colours.edge].map((colour, index) => (
    <meshStandardMaterial key={index} attach={`material-${index}`} color={colour} metalness={index === 2 ? 0 : 0.1} roughness={0.6} side={DoubleSide} clippingPlanes={planes}
      polygonOffset polygonOffsetFactor={1} polygonOffsetUnits={1} />
  ));
}

function FaceMesh({ face, thickness, frame, theme, clip }: PieceProps & { readonly face: Face }) {
  const solid = useMemo(() => faceGeometry(face, thickness), [face, thickness]);
  const edges = useMemo(() => new EdgesGeometry(solid, 30), [solid]);
  useDispose(solid);
  useDispose(edges);
  return (
    <group matrixAutoUpdate={false} matrix={frameMatrix(frame)}>
      <mesh geometry={solid}><SheetMaterials theme={theme} clip={clip} /></mesh>
      <lineSegments geometry={edges}><lineBasicMaterial color={stageColours[theme].line} clippingPlanes={clip ? [...clip] : null} /></lineSegments>
    </group>
  );
}

function BendMesh({ bend, thickness, angle, frame, theme, clip }: PieceProps & { readonly bend: Bend; readonly angle: number }) {
  const solid = useMemo(() => bendGeometry(bend, thickness, angle), [bend, thickness, angle]);
  useDispose(solid);
  return (
    <mesh geometry={solid} matrixAutoUpdate={false} matrix={frameMatrix(frame)}><SheetMaterials theme={theme} clip={clip} /></mesh>
  );
}
