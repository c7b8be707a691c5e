import type { BendWindow, OutlineVertex, RecognisedBend } from "./recognisedPart";

/**
 * A cut-out across a bend as it lies in the unfolded sheet, in the parent's coordinates: its rim on the parent, straight through the
 * bend zone, its rim on the child laid beside it, one allowance further out.
 */
export function windowHole({ onParent, onChild }: BendWindow, { parentEdge, start }: RecognisedBend, outline: readonly OutlineVertex[], allowance: number): readonly OutlineVertex[] {
  const [from, to] = [outline[parentEdge], outline[(parentEdge + 1) % outline.length]];
  if (!from || !to) return [];
  const length = Math.hypot(to[0] - from[0], to[1] - from[1]);
  const [ux, uy] = [(to[0] - from[0]) / length, (to[1] - from[1]) / length];
  // The child's x runs along the edge from the bend's start, its y towards the parent, which lies to the edge's left.
  const laid = ([x, y, bulge]: OutlineVertex): OutlineVertex => {
    const [along, inward] = [start + x, y - allowance];
    return [from[0] + ux * along - uy * inward, from[1] + uy * along + ux * inward, bulge];
  };
  return [...onParent, ...onChild.map(laid)];
}
