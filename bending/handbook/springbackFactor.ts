/** r2 / s of the columns: radius after over thickness. Column heads from memory. */
export const SPRINGBACK_COLUMNS: readonly number[] = [1, 1.6, 2.5, 4, 6.3, 10, 16, 25, 40, 63, 100];

/** kR by material, as printed in a German metal-trades table book; stainless has no entry beyond 40. */
export const springbackTable = {
  DC04: [0.99, 0.99, 0.99, 0.98, 0.97, 0.97, 0.96, 0.94, 0.91, 0.87, 0.83],
  DC01: [0.99, 0.99, 0.99, 0.97, 0.96, 0.96, 0.93, 0.9, 0.85, 0.77, 0.66],
  "X12CrNi18-8": [0.99, 0.98, 0.97, 0.95, 0.93, 0.89, 0.84, 0.76, 0.63],
  "E-Cu-R20": [0.98, 0.97, 0.97, 0.96, 0.95, 0.93, 0.9, 0.85, 0.79, 0.72, 0.6],
  "CuZn33-R29": [0.97, 0.97, 0.96, 0.95, 0.94, 0.93, 0.89, 0.86, 0.83, 0.77, 0.73],
  "Al99.0": [0.99, 0.99, 0.99, 0.99, 0.98, 0.98, 0.97, 0.97, 0.96, 0.95, 0.93],
  AlCuMg1: [0.98, 0.98, 0.98, 0.98, 0.97, 0.97, 0.96, 0.95, 0.93, 0.91, 0.87],
  AlSiMgMn: [0.98, 0.98, 0.97, 0.96, 0.95, 0.93, 0.9, 0.86, 0.82, 0.76, 0.72],
} as const satisfies Record<string, readonly number[]>;

export type SpringbackMaterial = keyof typeof springbackTable;

export interface SpringbackFactor {
  /** kR = angle after / angle under load. */
  readonly factor: number;
  /** True when the ratio lies between two columns: the printed table does not say this value. */
  readonly interpolated: boolean;
  readonly source: string;
}

/**
 * kR for a wanted radius over thickness. Between two columns straight in the logarithm of the ratio (the columns are a
 * preferred-number series), which is common practice, no source, and marked. Null outside the printed columns.
 */
export function springbackFactor(material: SpringbackMaterial, radiusOverThickness: number): SpringbackFactor | null {
  const row: readonly number[] = springbackTable[material];
  const right = SPRINGBACK_COLUMNS.findIndex((head) => head >= radiusOverThickness);
  const [head, factor] = [SPRINGBACK_COLUMNS[right], row[right]];
  if (head === undefined || factor === undefined) return null;
  const source = `German metal-trades table book, kR of ${material}; column heads from memory`;
  if (head === radiusOverThickness) return { factor, interpolated: false, source };
  const [headBefore, before] = [SPRINGBACK_COLUMNS[right - 1], row[right - 1]];
  if (headBefore === undefined || before === undefined) return null;
  const part = Math.log(radiusOverThickness / headBefore) / Math.log(head / headBefore);
  return { factor: before + part * (factor - before), interpolated: true, source };
}
