import type { MaterialFacts } from "@/bending/handbook/material";
import type { PlanDocument } from "@/bending/plan/planDocument";

export interface NewPlan {
  readonly partId: string;
  readonly revisionId: string;
  readonly machineId: string;
  readonly plan: PlanDocument;
  /** What the plan was made of, as it was. */
  readonly material: MaterialFacts;
  readonly machineDocument: unknown;
  /** The tools that the plan uses (tooling/1). */
  readonly tooling: unknown;
  /** SHA-256 over everything the plan follows from. */
  readonly inputsDigest: string;
  readonly by: string | null;
}
