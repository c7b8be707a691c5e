/** A count at least as great, out of a few (four between a power of two and the next), so that what is worked out for a count is shared. */
export function fewCounts(count: number): number {
  if (count <= 8) return count;
  const unit = 2 ** (Math.floor(Math.log2(count)) - 2);
  return Math.ceil(count / unit) * unit;
}
