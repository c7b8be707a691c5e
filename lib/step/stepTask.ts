import type { Result } from "@/bending/core/result";
import type { StepProblem, StepReading } from "@/lib/schemas/stepReading";

/** What the reading thread is given; the bytes are handed over, not copied. */
export interface StepTask {
  readonly bytes: Uint8Array;
  readonly body: number | null;
}

/** What the reading thread says, once. */
export type StepAnswer = Result<StepReading, StepProblem>;
