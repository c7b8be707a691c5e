/** Rounded to a millionth (mm or degrees): far under what a solid is exact to, and short to read. */
export const tidy = (value: number): number => Math.round(value * 1e6) / 1e6 + 0;
