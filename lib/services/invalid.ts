import type { FieldProblem } from "@/bending/core/problem";
import type { Failure } from "@/lib/api/failure";

/** Problems of a document that stands in one field of the request: their paths begin with that field. */
export function invalid(message: string, problems: readonly FieldProblem[], field = ""): Failure {
  const errors = problems.map(({ path, message: text }) => ({ path: joined(field, path), message: text }));
  return { kind: "invalid", message, errors };
}

function joined(field: string, path: string): string {
  if (field === "" || path === "") return field + path;
  return path.startsWith("[") ? field + path : `${field}.${path}`;
}
