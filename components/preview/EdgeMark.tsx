"use client";
import { useMemo } from "react";
import { Quaternion, Vector3 } from "three";
import type { Vec3 } from "@/bending/geometry/vec3";

interface EdgeMarkProps {
  readonly from: Vec3;
  readonly to: Vec3;
  readonly radius: number;
  readonly colour: string;
  /** 0: not seen, but still there for the pointer. */
  readonly opacity?: number;
}

/** A round bar along an edge. */
export function EdgeMark({ from, to, radius, colour, opacity = 1 }: EdgeMarkProps) {
  const { middle, length, turn } = useMemo(() => {
    const [a, b] = [new Vector3(...from), new Vector3(...to)];
    const along = b.clone().sub(a);
    return {
      middle: a.clone().add(b).multiplyScalar(0.5),
      length: along.length(),
      turn: new Quaternion().setFromUnitVectors(new Vector3(0, 1, 0), along.clone().normalize()),
    };
  }, [from, to]);
  return (
    <mesh position={middle} quaternion={turn}>
      <cylinderGeometry args={[radius, radius, length, 12]} />
      <meshBasicMaterial color={colour} transparent={opacity < 1} opacity={opacity} depthWrite={opacity > 0} />
    </mesh>
  );
}
