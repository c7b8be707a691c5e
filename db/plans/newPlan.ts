import type { MaterialFacts } from "@/bending/handbook/material";
import type { PlanEnd } from "@/bending/plan/planEnd";
import type { PlanDocument } from "@/bending/plan/planDocument";
import type { Tool } from "@/bending/tooling/tool";

export type PlanOriginRow = "planned" | "own order" | "chosen";

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
  readonly origin: PlanOriginRow;
  /** The plan that it was made from. */
  readonly fromPlanId: string | null;
  readonly ended: PlanEnd;
  readonly limitMs: number;
  /** What else was asked for, as the service puts it. */
  readonly asked: unknown;
  readonly by: string | null;
}
