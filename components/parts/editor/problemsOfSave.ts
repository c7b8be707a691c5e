import type { FieldProblem } from "@/bending/core/problem";
import { ApiProblem } from "@/lib/queries/apiProblem";

/** What the server refused, at the paths of the form: those of the document, and number and note beside it. */
export function problemsOfSave(error: Error | null): readonly FieldProblem[] {
  if (!(error instanceof ApiProblem)) return [];
  return [...error.errorsIn("document"), ...error.errors.filter(({ path }) => path === "number" || path === "note")];
}
