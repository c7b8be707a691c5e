/** What a part document may hold at most; common practice, far above real sheet-metal work. Lengths in mm. */
export const PART_LIMITS = {
  length: 100_000,
  thickness: 100,
  bends: 500,
  vertices: 10_000,
  holes: 2_000,
  name: 200,
  id: 64,
} as const;
