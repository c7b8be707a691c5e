"use client";
import { useMemo } from "react";
import { DoubleSide, EdgesGeometry, type Plane } from "three";
import type { ProfilePoint } from "@/bending/geometry/vec2";
import { profileGeometry } from "./profileGeometry";
import { useDispose } from "./useDispose";

interface ProfileMeshProps {
  readonly profile: readonly ProfilePoint[];
  readonly from: number;
  readonly to: number;
  readonly x?: number;
  readonly y: number;
  readonly colour: string;
  readonly line: string;
  readonly clip?: readonly Plane[] | undefined;
  /** Lets what stands behind shine through. */
  readonly glass?: boolean;
}

/** A profile run along the bed between two places. */
export function ProfileMesh({ profile, from, to, x = 0, y, colour, line, clip, glass = false }: ProfileMeshProps) {
  const solid = useMemo(() => profileGeometry(profile, to - from), [profile, from, to]);
  const edges = useMemo(() => new EdgesGeometry(solid, 25), [solid]);
  useDispose(solid);
  useDispose(edges);
  const planes = clip ? [...clip] : null;
  return (
    <group position={[x, y, from]}>
      <mesh geometry={solid} renderOrder={glass ? 2 : 0}>
        <meshStandardMaterial color={colour} metalness={0.1} roughness={0.6} side={DoubleSide} clippingPlanes={planes} transparent={glass} opacity={glass ? 0.22 : 1} depthWrite={!glass}
          polygonOffset polygonOffsetFactor={1} polygonOffsetUnits={1} />
      </mesh>
      <lineSegments geometry={edges}><lineBasicMaterial color={line} clippingPlanes={planes} transparent={glass} opacity={glass ? 0.35 : 0.8} /></lineSegments>
    </group>
  );
}
