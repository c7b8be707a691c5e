import type { FieldProblem } from "../core/problem";
import { fail, ok, type Result } from "../core/result";
import type { PlanDocument } from "./planDocument";
import { planSchema } from "./planSchema";

/** A stored plan read back, or what is wrong with it. */
export function readPlanDocument(json: unknown): Result<PlanDocument, readonly FieldProblem[]> {
  const read = planSchema.safeParse(json);
  if (read.success) return ok(read.data as PlanDocument);
  return fail(read.error.issues.map(({ path, message }) => ({ path: path.map(String).join(".") || "document", message })));
}
