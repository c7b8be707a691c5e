/** Upper end of each range in mm, and the deviation. ISO 2768-1:1989 table 1, class m; values from memory. */
const lengths: readonly (readonly [number, number])[] = [
  [6, 0.1], [30, 0.2], [120, 0.3], [400, 0.5], [1000, 0.8], [2000, 1.2], [4000, 2],
];

/** Upper end of the shorter side in mm, and the deviation in degrees. ISO 2768-1:1989 table 3, class m; values from memory. */
const angles: readonly (readonly [number, number])[] = [
  [10, 1], [50, 1 / 2], [120, 1 / 3], [400, 1 / 6], [Infinity, 1 / 12],
];

export const GENERAL_TOLERANCE = "ISO 2768-1 m";

/**
 * The general tolerance (plus and minus) that holds when a drawing states none: for a length in mm, or for an angle in
 * degrees whose shorter side is `size` mm. Null where the table has no entry (under 0.5 mm or over 4 m).
 */
export function generalTolerance(kind: "length" | "angle", size: number): number | null {
  if (kind === "length" && size < 0.5) return null;
  const row = (kind === "length" ? lengths : angles).find(([upTo]) => size <= upTo);
  return row ? row[1] : null;
}
