import type { LoopEdge, Solid } from "./solid";

export interface SolidTopology {
  /** For each edge the faces that it bounds. */
  readonly facesOf: readonly (readonly number[])[];
  /** For each face all its loop edges. */
  readonly around: readonly (readonly LoopEdge[])[];
}

export function solidTopology(solid: Solid): SolidTopology {
  const facesOf = solid.edges.map((): number[] => []);
  const around = solid.faces.map(({ loops }) => loops.flat());
  around.forEach((edges, face) => edges.forEach(({ edge }) => {
    const known = facesOf[edge];
    if (known && !known.includes(face)) known.push(face);
  }));
  return { facesOf, around };
}
