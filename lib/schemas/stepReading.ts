import { z } from "zod";
import type { RecognisedPart } from "@/bending/exchange/step/recognisedPart";
import type { SolidMesh } from "@/bending/exchange/step/solidMesh";

export const stepReadingQuerySchema = z.strictObject({
  /** Which body of a file with several, from 1. */
  body: z.coerce.number({ error: "must be the number of a body" }).int("must be a whole number").min(1, "must be 1 or more").max(100_000).optional(),
});

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

/** What a STEP file comes to: the part found in it with its solid to be drawn, or the bodies to choose one of. */
export type StepReading =
  | { readonly kind: "part"; readonly part: RecognisedPart; readonly mesh: SolidMesh }
  | { readonly kind: "choose"; readonly message: string; readonly bodies: readonly BodyFacts[] };
