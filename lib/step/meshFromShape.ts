import type { TopoDS_Shape } from "replicad-opencascadejs";
import type { Kernel } from "./kernel";
import { shapesIn } from "./shapesIn";
import type { SolidMesh } from "@/bending/exchange/step/solidMesh";

/** For the eye only: chords stand at most this far off, in parts of the body's size, and turn this much (radians). */
const CHORD_PART = 1e-3;
const TURN = 0.35;

/** A body of the kernel as triangles to be drawn, rounded to a thousandth of a millimetre. */
export function meshFromShape(kernel: Kernel, body: TopoDS_Shape, size: number): SolidMesh {
  const chord = Math.max(0.01, size * CHORD_PART);
  const positions: number[] = [];
  const triangles: number[] = [];
  const faces: (readonly [number, number])[] = [];
  kernel.ReplicadMeshExtractor.mesh(body, chord, TURN);
  for (const face of shapesIn(kernel, body, kernel.TopAbs_ShapeEnum.TopAbs_FACE)) {
    const data = kernel.ReplicadMeshExtractor.extract(face, chord, TURN, true);
    const memory = kernel.wasmMemory.buffer;
    const base = positions.length / 3;
    const first = triangles.length;
    for (const value of new Float32Array(memory, data.getVerticesPtr(), data.getVerticesSize())) positions.push(Math.round(value * 1e3) / 1e3);
    for (const corner of new Uint32Array(memory, data.getTrianglesPtr(), data.getTrianglesSize())) triangles.push(base + corner);
    faces.push([first, triangles.length - first]);
    data.delete();
  }
  return { positions, triangles, faces };
}
