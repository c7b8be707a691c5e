import { invariant } from "../core/invariant";
import type { Mm } from "../core/units";
import { bendDirections } from "../part/bendDirections";
import type { Bend, PartModel } from "../part/partModel";
import type { Hit } from "./hit";

/** How the sheet of a bend's wing lies in the machine, in coordinates of the unfolded sheet. */
export interface HitLine {
  readonly bend: Bend;
  readonly index: number;
  /** Is the bend's parent on the operator's side? */
  readonly parentInFront: boolean;
  /** Unit vector in the sheet that becomes the machine's z. */
  readonly along: readonly [number, number];
  /** Unit vector in the sheet from the parent to the child. */
  readonly across: readonly [number, number];
  /** Middle of the whole hit, measured along `along`. */
  readonly middle: Mm;
}

/** How one bend of a hit lies in the machine; `sides` as from `hitSides`. */
export function hitLine(part: PartModel, hit: Hit, which: number, sides: readonly boolean[]): HitLine {
  const bend = part.bends[which];
  invariant(bend, "a hit names bends of the part");
  const parentInFront = sides[bend.parent] === true;
  const { along: u, outward } = bendDirections(bend);
  const turn = (bend.direction === "up") === parentInFront ? -1 : 1;
  const along = [turn * u[0], turn * u[1]] as const;
  let [low, high] = [Infinity, -Infinity];
  for (const other of hit.bends) {
    for (const point of part.bends[other]?.line ?? []) {
      const z = along[0] * point[0] + along[1] * point[1];
      low = Math.min(low, z);
      high = Math.max(high, z);
    }
  }
  return { bend, index: which, parentInFront, along, across: outward, middle: ((low + high) / 2) as Mm };
}
