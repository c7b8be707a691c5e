import type { MaterialFacts } from "@/bending/handbook/material";
import type { PlanDocument } from "@/bending/plan/planDocument";
import type { Tool } from "@/bending/tooling/tool";

export interface NewPlan {
  readonly partId: string;
  readonly revisionId: string;
  readonly machineId: string;
  readonly plan: PlanDocument;
  /** What the plan was made of, as it was. */
  readonly material: MaterialFacts;
  /** The recorded version that `material` is. */
  readonly materialVersionId: string | null;
  readonly machineDocument: unknown;
  /** The tools that the plan uses, with the pieces that were in service. */
  readonly tools: readonly Tool[];
  /** SHA-256 over everything the plan follows from. */
  readonly inputsDigest: string;
  readonly by: string | null;
}
