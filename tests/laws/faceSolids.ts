import type { Manifold, ManifoldToplevel } from "manifold-3d";
import { foldFrames, type PartModel } from "@/bending";

/** The plane part of each face of the finished part as a plate, in the part frame. */
export function faceSolids(wasm: ManifoldToplevel, part: PartModel): ReadonlyMap<string, Manifold> {
  const frames = foldFrames(part, part.bends.map((bend) => bend.angle));
  return new Map(part.faces.map((face, i) => {
    const { x, y, z, o } = frames[i] ?? { x: [1, 0, 0], y: [0, 1, 0], z: [0, 0, 1], o: [0, 0, 0] };
    const rings = [face.outline, ...face.holes].map((ring) => ring.map(([px, py]): [number, number] => [px, py]));
    return [face.id, wasm.Manifold.extrude(new wasm.CrossSection(rings, "EvenOdd"), part.thickness).transform([...x, 0, ...y, 0, ...z, 0, ...o, 1])];
  }));
}
