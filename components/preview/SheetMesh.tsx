"use client";
import { Line } from "@react-three/drei";
import type { ThreeEvent } from "@react-three/fiber";
import { useMemo } from "react";
import { DoubleSide, EdgesGeometry, type Plane } from "three";
import type { Frame } from "@/bending/geometry/frame";
import type { FlatRegion, FormedAngles, PartModel } from "@/bending/part/partModel";
import { sheetRegions } from "@/bending/part/sheetRegions";
import { bendGeometry } from "./bendGeometry";
import { faceGeometry } from "./faceGeometry";
import { frameMatrix } from "./frameMatrix";
import type { PartPicking } from "./partPicking";
import { DRAGGED_PX } from "./PickEdges";
import { SideLetters } from "./SideLetters";
import { stageColours, type StageTheme } from "./stageColours";
import { useDispose } from "./useDispose";
import { zoneGeometry } from "./zoneGeometry";

interface SheetMeshProps {
  readonly part: PartModel;
  readonly frames: readonly Frame[];
  readonly angles: FormedAngles;
  readonly theme: StageTheme;
  readonly clip?: readonly Plane[] | undefined;
  readonly letters?: boolean;
  readonly picking?: PartPicking | undefined;
}

/** The sheet folded so far: faces, bend arcs, edges, and the letters of its two sides. */
export function SheetMesh({ part, frames, angles, theme, clip, letters = true, picking }: SheetMeshProps) {
  const cut = useMemo(() => (part.holesAcross.length === 0 && part.bends.every(({ region }) => region === null) ? null : sheetRegions(part)), [part]);
  return (
    <group>
      {part.faces.map((face, index) => {
        const frame = frames[index];
        return frame ? (cut?.faces[index] ?? [face]).map((region, piece) => <FaceMesh key={`${face.id} ${piece}`} face={region} thickness={part.thickness} frame={frame} theme={theme} clip={clip}
          picked={picking?.picked === face.id} onPick={picking === undefined ? undefined : () => picking.onFace(face.id)} />) : null;
      })}
      {part.bends.map((bend, index) => {
        const frame = frames[bend.parent];
        return frame ? <BendMesh key={bend.id} part={part} index={index} regions={cut?.zones[index] ?? null} angle={angles[index] ?? 0} frame={frame} theme={theme} clip={clip} /> : null;
      })}
      {letters ? <SideLetters part={part} frames={frames} theme={theme} /> : null}
    </group>
  );
}

interface PieceProps { readonly frame: Frame; readonly theme: StageTheme; readonly clip: readonly Plane[] | undefined }

function SheetMaterials({ theme, clip }: Pick<PieceProps, "theme" | "clip">) {
  const colours = stageColours[theme];
  const planes = clip ? [...clip] : null;
  return [colours.sideA, colours.sideB, colours.edge].map((colour, index) => (
    <meshStandardMaterial key={index} attach={`material-${index}`} color={colour} metalness={index === 2 ? 0 : 0.1} roughness={0.6} side={DoubleSide} clippingPlanes={planes}
      polygonOffset polygonOffsetFactor={1} polygonOffsetUnits={1} />
  ));
}

interface FaceMeshProps extends PieceProps {
  readonly face: FlatRegion;
  readonly thickness: number;
  readonly picked: boolean;
  readonly onPick: (() => void) | undefined;
}

function FaceMesh({ face, thickness, frame, theme, clip, picked, onPick }: FaceMeshProps) {
  const solid = useMemo(() => faceGeometry(face, thickness), [face, thickness]);
  const edges = useMemo(() => new EdgesGeometry(solid, 30), [solid]);
  useDispose(solid);
  useDispose(edges);
  return (
    <group matrixAutoUpdate={false} matrix={frameMatrix(frame)}>
      <mesh geometry={solid} {...(onPick === undefined ? {} : { onClick: (event: ThreeEvent<MouseEvent>) => { if (event.delta <= DRAGGED_PX) { event.stopPropagation(); onPick(); } } })}>
        <SheetMaterials theme={theme} clip={clip} /></mesh>
      {picked ? [0, thickness].map((z) => <Line key={z} points={closed(face).map(([x, y]) => [x, y, z] as const)} color={stageColours[theme].letter} lineWidth={3.5} />) : null}
      <lineSegments geometry={edges}><lineBasicMaterial color={stageColours[theme].line} clippingPlanes={clip ? [...clip] : null} /></lineSegments>
    </group>
  );
}

const closed = ({ outline }: FlatRegion) => [...outline, ...outline.slice(0, 1)];

interface BendMeshProps extends PieceProps {
  readonly part: PartModel;
  readonly index: number;
  /** The sheet within the zone where it is not simply the whole zone. */
  readonly regions: readonly FlatRegion[] | null;
  readonly angle: number;
}

function BendMesh({ part, index, regions, angle, frame, theme, clip }: BendMeshProps) {
  const bend = part.bends[index];
  const solid = useMemo(() => (regions === null && bend !== undefined ? bendGeometry(bend, part.thickness, angle) : zoneGeometry(part, index, regions ?? [], angle)), [part, index, bend, regions, angle]);
  useDispose(solid);
  return (
    <mesh geometry={solid} matrixAutoUpdate={false} matrix={frameMatrix(frame)}><SheetMaterials theme={theme} clip={clip} /></mesh>
  );
}
