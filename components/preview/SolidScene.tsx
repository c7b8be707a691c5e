"use client";
import { useMemo } from "react";
import { DoubleSide, EdgesGeometry } from "three";
import type { FaceRole } from "@/bending/exchange/step/recognisedPart";
import type { SolidMesh } from "@/bending/exchange/step/solidMesh";
import type { Frame } from "@/bending/geometry/frame";
import { applyFrame } from "@/bending/geometry/applyFrame";
import { invertFrame } from "@/bending/geometry/invertFrame";
import { FitView, type FitTarget } from "./FitView";
import { frameMatrix } from "./frameMatrix";
import { hatch } from "./hatch";
import { solidGeometry } from "./solidGeometry";
import { StageCanvas } from "./StageCanvas";
import { stageColours } from "./stageColours";
import { useDispose } from "./useDispose";

export interface SolidSceneProps {
  readonly mesh: SolidMesh;
  readonly roles: readonly FaceRole[];
  /** The base's own frame in the solid; it is laid level, its top up. */
  readonly base: Frame;
  /** Faces to point out. */
  readonly marked: readonly number[];
  readonly label: string;
  readonly onLost: () => void;
}

const groups: Readonly<Record<FaceRole, number>> = { sheet: 0, bend: 1, edge: 2, "left out": 3 };
const MARKED = 4;

/** A solid as it was read: sides, bends and cut edges each in a tone of steel, what was not understood hatched in amber. */
export default function SolidScene({ mesh, roles, base, marked, label, onLost }: SolidSceneProps) {
  const toBase = useMemo(() => invertFrame(base), [base]);
  const geometry = useMemo(() => solidGeometry(mesh, (face) => (marked.includes(face) ? MARKED : groups[roles[face] ?? "edge"])), [mesh, roles, marked]);
  const edges = useMemo(() => new EdgesGeometry(geometry, 25), [geometry]);
  const target = useMemo(() => solidTarget(mesh, toBase), [mesh, toBase]);
  useDispose(geometry);
  useDispose(edges);
  const colours = stageColours.light;
  return (
    <StageCanvas theme="light" label={label} onLost={onLost}>
      <FitView preset="part" target={target} />
      <group rotation={[-Math.PI / 2, 0, 0]}>
        <group matrixAutoUpdate={false} matrix={frameMatrix(toBase)}>
          <mesh geometry={geometry}>
            {[colours.sideA, colours.sideB, colours.edge, colours.finger, colours.mark].map((colour, index) => (
              <meshStandardMaterial key={index} attach={`material-${index}`} color={colour} roughness={0.6} side={DoubleSide} polygonOffset polygonOffsetFactor={1} polygonOffsetUnits={1}
                {...(index === groups["left out"] ? { onBeforeCompile: hatch, customProgramCacheKey: () => "hatch" } : {})} />
            ))}
          </mesh>
          <lineSegments geometry={edges}><lineBasicMaterial color={colours.line} /></lineSegments>
        </group>
      </group>
    </StageCanvas>
  );
}

/** In the view's axes: the base's z stands up. */
function solidTarget({ positions }: SolidMesh, toBase: Frame): FitTarget {
  const [least, most] = [[Infinity, Infinity, Infinity], [-Infinity, -Infinity, -Infinity]];
  for (let i = 0; i < positions.length; i += 3) {
    applyFrame(toBase, [positions[i] ?? 0, positions[i + 1] ?? 0, positions[i + 2] ?? 0]).forEach((value, axis) => {
      least[axis] = Math.min(least[axis] ?? value, value);
      most[axis] = Math.max(most[axis] ?? value, value);
    });
  }
  const middle = (axis: number) => ((least[axis] ?? 0) + (most[axis] ?? 0)) / 2;
  const size = (axis: number) => (most[axis] ?? 0) - (least[axis] ?? 0);
  return { centre: [middle(0), middle(2), -middle(1)], radius: Math.max(5, (Math.hypot(size(0), size(1), size(2)) / 2) * 1.05) };
}
