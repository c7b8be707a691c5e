"use client";
import { useMemo } from "react";
import { Quaternion, Vector3 } from "three";
import type { Vec3 } from "@/bending/geometry/vec3";

/** A round bar along an edge: what stands at the gauge. */
export function EdgeMark({ from, to, radius, colour }: { readonly from: Vec3; readonly to: Vec3; readonly radius: number; readonly colour: string }) {
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
      <meshBasicMaterial color={colour} />
    </mesh>
  );
}
