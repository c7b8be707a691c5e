/**
 * May these bends be formed next, where some of them belong to rows of strokes? A row is made from one of its ends to the other, without a gap.
 * `rows` as from `splitBends`.
 */
export function inRow(rows: readonly number[], bends: readonly number[], formed: number): boolean {
  return bends.every((bend) => {
    const row = rows[bend] ?? 0;
    if (row === 0) return true;
    const bit = 1 << bend;
    const before = row & (bit - 1);
    const behind = row & ~(bit | (bit - 1));
    const done = formed & row;
    return done === before || done === behind;
  });
}
