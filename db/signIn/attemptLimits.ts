/** Failures allowed in the window before further attempts wait. Common practice, no source. */
export const attemptLimits = { perAccount: 5, perAddress: 30, windowMinutes: 15 } as const;
