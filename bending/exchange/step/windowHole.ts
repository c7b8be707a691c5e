import type { BendWindow, OutlineVertex, RecognisedBend } from "./recognisedPart";

/**
 * A cut-out in a bend as it lies in the unfolded sheet, in the parent's coordinates: its rim on the parent, its way through the bend
 * zone, which is one allowance wide, and its rim on the child laid beside it.
 */
export function windowHole({ pieces }: BendWindow, { parentEdge, start }: Pick<RecognisedBend, "parentEdge" | "start">, outline: readonly OutlineVertex[], allowance: number): readonly OutlineVertex[] {
  const [from, to] = [outline[parentEdge], outline[(parentEdge + 1) % outline.length]];
  if (!from || !to) return [];
  const length = Math.hypot(to[0] - from[0], to[1] - from[1]);
  const [ux, uy] = [(to[0] - from[0]) / length, (to[1] - from[1]) / length];
  // The parent lies to the left of its edge, the bend and the child to the right.
  const laid = (along: number, outward: number, bulge: number): OutlineVertex => [from[0] + ux * (start + along) + uy * outward, from[1] + uy * (start + along) - ux * outward, bulge];
  return pieces.flatMap((piece): readonly OutlineVertex[] => {
    if (piece.on === "bend") return piece.path.map(([along, turn]) => laid(along, turn * allowance, 0));
    // The child's x runs along the edge from the bend's start, its y towards the parent.
    return piece.on === "parent" ? piece.rim : piece.rim.map(([x, y, bulge]) => laid(x, allowance - y, bulge));
  });
}
