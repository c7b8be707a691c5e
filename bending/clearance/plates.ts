import type { Prism } from "./prism";

/** All plates of a face with its near bend zone. */
export interface Plates {
  readonly all: readonly Prism[];
  /** Plates that lie together (the face's, the zone's), each with the eight corners of their common box. */
  readonly groups: readonly { readonly prisms: readonly Prism[]; readonly box: Float64Array }[];
  readonly a: readonly [number, number];
  readonly b: readonly [number, number];
}

export function platesOf(prisms: readonly Prism[]): Plates {
  const groups = (["face", "zone"] as const).flatMap((of) => {
    const own = prisms.filter((prism) => prism.of === of);
    return own.length ? [{ prisms: own, box: boxOf(own) }] : [];
  });
  return { all: prisms, groups, a: extent(prisms, "a"), b: extent(prisms, "b") };
}

function extent(prisms: readonly Prism[], axis: "a" | "b" | "z"): readonly [number, number] {
  return [Math.min(...prisms.map((prism) => prism[axis][0])), Math.max(...prisms.map((prism) => prism[axis][1]))];
}

function boxOf(prisms: readonly Prism[]): Float64Array {
  const points = new Float64Array(24);
  const [a, b, z] = [extent(prisms, "a"), extent(prisms, "b"), extent(prisms, "z")];
  for (let i = 0; i < 8; i++) points.set([a[i & 1] ?? 0, b[(i >> 1) & 1] ?? 0, z[(i >> 2) & 1] ?? 0], 3 * i);
  return points;
}
