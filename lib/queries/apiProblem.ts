import type { FieldProblem } from "@/bending/core/problem";
import type { Problem } from "@/lib/schemas/problem";

/** What the server, or the way to it, answered instead of what was asked for. */
export class ApiProblem extends Error {
  /** HTTP status; 0 when the server could not be reached. */
  readonly status: number;
  readonly title: string;
  readonly errors: readonly FieldProblem[];

  constructor(problem: Pick<Problem, "status" | "title" | "detail" | "errors">) {
    super(problem.detail ?? problem.title);
    this.name = "ApiProblem";
    this.status = problem.status;
    this.title = problem.title;
    this.errors = problem.errors ?? [];
  }

  /** The problems inside one field, with paths from there: `errorsIn("document")` for a part document. */
  errorsIn(field: string): readonly FieldProblem[] {
    return this.errors
      .filter((entry) => entry.path === field || entry.path.startsWith(`${field}.`))
      .map((entry) => ({ ...entry, path: entry.path.slice(field.length + 1) }));
  }

  /** What to say beside the field at this path. */
  messageAt(path: string): string | undefined {
    return this.errors.find((entry) => entry.path === path)?.message;
  }
}
