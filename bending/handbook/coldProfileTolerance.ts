import { mm, type Mm } from "../core/units";

type Rows = readonly (readonly [upTo: number, deviations: readonly [number, number, number]])[];

const TABLES: Record<"bend-to-bend" | "bend-to-edge", Rows> = {
  "bend-to-bend": [[50, [0.75, 1, 1]], [100, [1, 1, 1.25]], [220, [1, 1.25, 1.5]]],
  "bend-to-edge": [[40, [1.2, 1.5, 2]], [80, [1.5, 1.5, 2]], [120, [1.5, 2, 2]]],
};

/**
 * Plus and minus of an outside size of a cold profile: bend to bend, or bend to a free edge, by size and by wall under 3,
 * 3 to 5, and 5 to 8 mm (DIN 59413). Stands in where DIN 6935's own table is not at hand. Null outside the tables.
 */
export function coldProfileTolerance(kind: "bend-to-bend" | "bend-to-edge", size: Mm, wall: Mm): Mm | null {
  const row = TABLES[kind].find(([upTo]) => size <= upTo);
  const column = wall < 3 ? 0 : wall <= 5 ? 1 : wall <= 8 ? 2 : null;
  const value = column === null ? undefined : row?.[1][column];
  return value === undefined ? null : mm(value);
}
