import type { Mm } from "../core/units";
import { convexPieces } from "../geometry/convexPieces";
import type { PartModel } from "../part/partModel";
import type { Halves } from "./createAsks";
import { createBendShapes } from "./createBendShapes";
import { createHalf } from "./createHalf";
import { createSelf, type Self } from "./createSelf";
import type { Half } from "./half";
import type { Counts } from "./question";
import type { Hit } from "./hit";

/** A hit (bends and front), whatever else is formed. */
export interface HitPlace extends Halves {
  readonly self: Self;
  /** Is the half in front the one that `self` calls `one`? */
  readonly oneInFront: boolean;
}

interface Parted { readonly sides: readonly [Half, Half]; readonly self: Self; readonly places: [HitPlace | null, HitPlace | null] }

/** Finds the halves of a hit again; both fronts share them. */
export function createHitPlaces(part: PartModel, margin: Mm, counts: Counts): (hit: Pick<Hit, "bends" | "front">) => HitPlace {
  const pieces = part.faces.map((face) => convexPieces(face.outline, face.holes));
  const shapes = createBendShapes(part);
  const parted = new Map<string, Parted>();
  const quick = new WeakMap<readonly number[], HitPlace[]>();

  const partAt = (bends: readonly number[]): Parted => {
    const key = bends.join();
    const known = parted.get(key);
    if (known) return known;
    const behind = (front: number) => createHalf(part, bends, front, pieces, shapes);
    const other = behind(0);
    const one = behind(other.paths[0]?.face ?? 0);
    const made: Parted = { sides: [one, other], self: createSelf(part, one, other, margin, counts), places: [null, null] };
    parted.set(key, made);
    return made;
  };
  return ({ bends, front }) => {
    const known = quick.get(bends)?.[front];
    if (known) return known;
    const { sides: [one, other], self, places } = partAt(bends);
    const oneInFront = one.paths.some(({ face }) => face === front);
    const place = (places[oneInFront ? 0 : 1] ??= { front: oneInFront ? one : other, back: oneInFront ? other : one, self, oneInFront });
    const row = quick.get(bends) ?? [];
    row[front] = place;
    quick.set(bends, row);
    return place;
  };
}
