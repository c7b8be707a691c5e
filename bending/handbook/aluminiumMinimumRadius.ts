import { MM_PER_INCH, mm, type Mm } from "../core/units";

/** The printed thicknesses, in. */
export const aluminiumThicknesses: readonly number[] = [1 / 64, 1 / 32, 1 / 16, 1 / 8, 3 / 16, 1 / 4, 3 / 8, 1 / 2];

/** Inside radius over thickness of a cold bend of 90 degrees, for 1/64, 1/32, 1/16, 1/8, 3/16, 1/4, 3/8 and 1/2 in. */
export const aluminiumRadii = {
  "1100-H14": [0, 0, 0, 1, 1, 1.5, 2, 2.5],
  "5052-O": [0, 0, 0, 0.5, 1, 1, 1.5, 1.5],
  "5052-H32": [0, 0, 1, 1.5, 1.5, 1.5, 1.5, 2],
  "5052-H34": [0, 1, 1.5, 2, 2, 2.5, 2.5, 3],
  "5052-H36": [1, 1, 1.5, 2.5, 3, 3.5, 4, 4.5],
  "6061-O": [0, 0, 0, 1, 1, 1, 1.5, 2],
  "6061-T4": [0, 0, 1, 1.5, 2.5, 3, 3.5, 4],
  "6061-T6": [1, 1, 1.5, 2.5, 3, 3.5, 4.5, 5],
} as const satisfies Record<string, readonly number[]>;

export type AluminiumTemper = keyof typeof aluminiumRadii;

export interface AluminiumRadius {
  readonly radius: Mm;
  readonly timesThickness: number;
  /** The table has no column for this thickness; its next thicker one is used, which is the cautious way. */
  readonly betweenColumns: boolean;
  readonly source: string;
}

/** Half the rounding of a sheet thickness given in thousandths of an inch, mm. */
export const SAME_SHEET_MM = 0.013;

/**
 * Smallest inside radius of aluminium bent cold through 90 degrees (Aluminum Association table, as reproduced on a design
 * page). Null over 1/2 in.
 */
export function aluminiumMinimumRadius(temper: AluminiumTemper, thickness: Mm): AluminiumRadius | null {
  const column = aluminiumThicknesses.findIndex((head) => thickness <= head * MM_PER_INCH + SAME_SHEET_MM);
  const [head, times] = [aluminiumThicknesses[column], aluminiumRadii[temper][column]];
  if (head === undefined || times === undefined) return null;
  return {
    radius: mm(times * thickness),
    timesThickness: times,
    betweenColumns: Math.abs(head * MM_PER_INCH - thickness) > SAME_SHEET_MM,
    source: `Aluminum Association bend table, ${temper}, 90 degrees`,
  };
}
