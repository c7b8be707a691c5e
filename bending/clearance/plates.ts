import type { Bounds } from "./half";
import type { Prism } from "./prism";

/** All plates of a face with its near bend zone. */
export interface Plates {
  readonly all: readonly Prism[];
  /** Plates that lie together (the face's, the zone's), each with the box round them. */
  readonly groups: readonly { readonly prisms: readonly Prism[]; readonly bounds: Bounds }[];
}

export function platesOf(prisms: readonly Prism[]): Plates {
  const groups = (["face", "zone"] as const).flatMap((of) => {
    const own = prisms.filter((prism) => prism.of === of);
    return own.length ? [{ prisms: own, bounds: { a: extent(own, "a"), b: extent(own, "b"), z: extent(own, "z") } }] : [];
  });
  return { all: prisms, groups };
}

function extent(prisms: readonly Prism[], axis: "a" | "b" | "z"): readonly [number, number] {
  return [Math.min(...prisms.map((prism) => prism[axis][0])), Math.max(...prisms.map((prism) => prism[axis][1]))];
}
