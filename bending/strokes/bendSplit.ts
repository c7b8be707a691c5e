import type { Mm } from "../core/units";

/**
 * One bend that several strokes make, each along its own line within the bend's zone: a large radius in small turns, all alike and
 * evenly spread over the zone. The folded shape is the polygon round the arc that the strokes really leave; the flat stays.
 */
export interface BendSplit {
  readonly bend: string;
  readonly hits: number;
  /** Neutral length of each stroke's own zone; the sheet between two zones stays plane. */
  readonly allowance: Mm;
}
