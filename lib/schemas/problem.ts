import type { FieldProblem } from "@/bending/core/problem";

/** A problem response (RFC 9457), `application/problem+json`. */
export interface Problem {
  readonly type: string;
  readonly title: string;
  readonly status: number;
  readonly detail?: string;
  /** One entry for each field that must change. */
  readonly errors?: readonly FieldProblem[];
}
