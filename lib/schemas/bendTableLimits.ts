/** What a trial's numbers may be, in millimetres and degrees: far past any press brake, so that only a slip is caught. */
export const trialLimits = {
  nominal: { above: 0, most: 50 },
  thickness: { above: 0, most: 50 },
  vOpening: { above: 0, most: 500 },
  punchRadius: { least: 0, most: 200 },
  blank: { above: 0, most: 20_000 },
  flangeA: { above: 0, most: 20_000 },
  flangeB: { above: 0, most: 20_000 },
  insideRadius: { least: 0, most: 500 },
} as const satisfies Readonly<Record<string, { readonly above?: number; readonly least?: number; readonly most: number }>>;

export type TrialLengthField = keyof typeof trialLimits;

/** Degrees turned through: a flat sheet (0) and one folded back on itself (180) are no trial bends. */
export const trialAngle = { above: 0, below: 180 } as const;

/** Most lines that are saved at once. */
export const trialLinesMost = 200;
