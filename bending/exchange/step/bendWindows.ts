import type { BendWindow, OutlineVertex } from "./recognisedPart";

/** Pairs what is cut out of the parent's edge along a bend with what is cut out of the child's, by where they lie along it. */
export function bendWindows(
  onParent: readonly (readonly OutlineVertex[])[], onChild: readonly (readonly OutlineVertex[])[], outline: readonly OutlineVertex[], edge: number, start: number,
): readonly BendWindow[] {
  const [from, to] = [outline[edge], outline[(edge + 1) % outline.length]];
  if (!from || !to) return [];
  const length = Math.hypot(to[0] - from[0], to[1] - from[1]);
  const along = ([x, y]: OutlineVertex) => ((x - from[0]) * (to[0] - from[0]) + (y - from[1]) * (to[1] - from[1])) / length - start;
  return onParent.flatMap((rim): BendWindow[] => {
    const [first, last] = [rim[0], rim[rim.length - 1]];
    if (!first || !last) return [];
    const middle = (along(first) + along(last)) / 2;
    const facing = onChild.find((other) => Math.min(other[0]?.[0] ?? 0, other[other.length - 1]?.[0] ?? 0) < middle && Math.max(other[0]?.[0] ?? 0, other[other.length - 1]?.[0] ?? 0) > middle);
    return facing ? [{ onParent: rim, onChild: facing }] : [];
  });
}
