/** The most that is read at once. */
export const csvLimits = { lines: 5000, bytes: 2_000_000 } as const;
