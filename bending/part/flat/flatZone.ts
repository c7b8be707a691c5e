import type { EdgeAxes } from "../edgeCut";
import type { ResolvedBend } from "../resolveBend";
import type { MaterialChord } from "./materialChords";
import type { ZoneCorner } from "./zoneCorner";

/** The zone of a bend on a drawn flat, over one stretch of material along its line: half the allowance to each side. */
export interface FlatZone {
  readonly bend: ResolvedBend;
  readonly strokeWith: string | null;
  /** Of the line in the document. */
  readonly path: string;
  /** Along the drawn line; inward is its left. */
  readonly axes: EdgeAxes;
  readonly half: number;
  readonly chord: MaterialChord;
  readonly right: readonly [ZoneCorner, ZoneCorner];
  readonly left: readonly [ZoneCorner, ZoneCorner];
}
