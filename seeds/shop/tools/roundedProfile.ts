/** A profile as a drawing gives it, to the thousandth of a millimetre. */
export const roundedProfile = (points: readonly (readonly [number, number])[]): readonly (readonly [number, number])[] =>
  points.map(([x, y]) => [rounded(x), rounded(y)] as const);

const rounded = (value: number): number => Math.round(value * 1000) / 1000 + 0;
