/** Answers the bits of a set that a mask names, packed together: the place of a state in a table over those bits alone. */
export function pickBits(mask: number): (set: number) => number {
  const places: number[] = [];
  for (let bit = 0; bit < 31; bit += 1) if ((mask >> bit) & 1) places.push(bit);
  const tables = [0, 8, 16, 24].map((shift) => Int32Array.from({ length: 256 }, (_, byte) =>
    places.reduce((packed, bit, at) => (bit >= shift && bit < shift + 8 && (byte >> (bit - shift)) & 1 ? packed | (1 << at) : packed), 0)));
  const [a, b, c, d] = tables as [Int32Array, Int32Array, Int32Array, Int32Array];
  if (mask < 1 << 16) return (set) => (a[set & 255] as number) | (b[(set >> 8) & 255] as number);
  return (set) => (a[set & 255] as number) | (b[(set >> 8) & 255] as number) | (c[(set >> 16) & 255] as number) | (d[(set >> 24) & 255] as number);
}
