/** A body of a file, for a person to choose from. */
export interface BodyFacts {
  /** From 1, in the file's order. */
  readonly body: number;
  readonly faces: number;
  /** mm³. */
  readonly volume: number;
  /** Along x, y and z, mm. */
  readonly size: readonly [number, number, number];
}

/** Why a file could not be read as a sheet-metal part. */
export interface StepProblem {
  readonly kind: "not-step" | "cut-off" | "too-large" | "too-many-faces" | "no-solid" | "surface-model" | "several-bodies" | "unreadable" | "not-sheet-metal" | "too-long" | "too-much-memory";
  readonly message: string;
  readonly bodies?: readonly BodyFacts[];
}
