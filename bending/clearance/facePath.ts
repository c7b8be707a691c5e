import type { PartModel } from "../part/partModel";
import type { Hit } from "./hit";
import { hitLine, type HitLine } from "./hitLine";
import { hitSides } from "./hitSides";

/** How a face hangs on a hit: the wing that it moves with, and the bends between that wing and the face. */
export interface FacePath {
  readonly face: number;
  /** The hit's bend that the wing lies at. */
  readonly line: HitLine;
  /** Is the wing the bend's parent (else its child)? */
  readonly wingIsParent: boolean;
  readonly inFront: boolean;
  /** Bend indices from the wing outwards; empty for the wing itself. */
  readonly bends: readonly number[];
  /** The same as bits: only these decide where the face stands. */
  readonly mask: number;
}

/** For every face its shortest way to a bend of the hit. */
export function facePaths(part: PartModel, hit: Hit): readonly FacePath[] {
  const sides = hitSides(part, hit);
  const found: (FacePath | undefined)[] = part.faces.map(() => undefined);
  let ring: FacePath[] = hit.bends.flatMap((which) => {
    const line = hitLine(part, hit, which, sides);
    return [true, false].map((wingIsParent): FacePath => ({
      face: wingIsParent ? line.bend.parent : line.bend.child,
      line, wingIsParent, inFront: line.parentInFront === wingIsParent, bends: [], mask: 0,
    }));
  });
  while (ring.length) {
    const fresh = ring.filter((path) => !found[path.face] && (found[path.face] = path));
    ring = fresh.flatMap((path) => part.bends.flatMap((bend, i): readonly FacePath[] => {
      if (hit.bends.includes(i) || (bend.parent !== path.face && bend.child !== path.face)) return [];
      const face = bend.parent === path.face ? bend.child : bend.parent;
      return [{ ...path, face, bends: [...path.bends, i], mask: path.mask | (1 << i) }];
    }));
  }
  return found.filter((path) => path !== undefined);
}
